import { Clipboard } from '@angular/cdk/clipboard';
import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';

/** Copies a text and says so, in its own words and to a screen reader. */
@Component({
  selector: 'app-copy-button',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <button type="button" class="link-button no-print" (click)="copy()">
      {{ words[state()] }}<span class="visually-hidden"> {{ what() }}</span>
    </button>
    <span class="visually-hidden" role="status">{{
      state() === 'copied' ? what() + ' copied' : ''
    }}</span>
  `,
  styles: `
    :host {
      white-space: nowrap;
      position: relative;
    }
  `,
})
export class CopyButton {
  private readonly clipboard = inject(Clipboard);

  readonly text = input.required<string>();
  /** What is copied, for those who cannot see beside what the button stands. */
  readonly what = input.required<string>();

  protected readonly state = signal<'ready' | 'copied' | 'failed'>('ready');
  protected readonly words = {
    ready: 'Copy',
    copied: 'Copied',
    failed: 'Select the text and copy it',
  };

  protected copy(): void {
    this.state.set(this.clipboard.copy(this.text()) ? 'copied' : 'failed');
    setTimeout(() => this.state.set('ready'), 3_000);
  }
}
