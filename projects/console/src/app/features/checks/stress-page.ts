import { ChangeDetectionStrategy, Component } from '@angular/core';
import { StressCheck, type StressRequest } from '@headtree/checks';
import { CheckHead } from './check-head';
import { stressExample } from './example';
import { RequestPage } from './request-page';

/** The library's stress check on a page of the console. */
@Component({
  selector: 'app-stress-page',
  imports: [CheckHead, StressCheck],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-check-head
      heading="Stress check"
      [link]="link()"
      [unreadable]="unreadable"
      (filledIn)="fillIn()"
    />
    <htc-stress
      class="check"
      credentials="session"
      [value]="request()"
      (valueChange)="keep($event)"
    />
  `,
  styleUrl: './check-page.scss',
})
export class StressPage extends RequestPage<StressRequest> {
  protected readonly path = '/checks/stress';
  protected readonly example = stressExample;
}
