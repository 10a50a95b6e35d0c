import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { ColourScheme, type Scheme } from './scheme';

@Component({
  selector: 'app-scheme-switch',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <fieldset>
      <legend>Paper</legend>
      @for (option of options; track option.scheme) {
        <label>
          <input
            type="radio"
            name="scheme"
            [checked]="scheme.chosen() === option.scheme"
            (change)="scheme.choose(option.scheme)"
          /><span>{{ option.word }}</span>
        </label>
      }
    </fieldset>
  `,
  styleUrl: './scheme-switch.scss',
})
export class SchemeSwitch {
  protected readonly scheme = inject(ColourScheme);
  protected readonly options: readonly { scheme: Scheme; word: string }[] = [
    { scheme: 'system', word: 'Auto' },
    { scheme: 'light', word: 'Light' },
    { scheme: 'dark', word: 'Dark' },
  ];
}
