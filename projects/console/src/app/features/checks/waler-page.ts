import { ChangeDetectionStrategy, Component } from '@angular/core';
import { WalerCheck, type WalerRequest } from '@headtree/checks';
import { CheckHead } from './check-head';
import { walerExample } from './example';
import { RequestPage } from './request-page';

/** The library's waler check on a page of the console. */
@Component({
  selector: 'app-waler-page',
  imports: [CheckHead, WalerCheck],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-check-head
      heading="Waler check"
      [link]="link()"
      [unreadable]="unreadable"
      (filledIn)="fillIn()"
    />
    <htc-waler
      class="check"
      credentials="session"
      [value]="request()"
      (valueChange)="keep($event)"
    />
  `,
  styleUrl: './check-page.scss',
})
export class WalerPage extends RequestPage<WalerRequest> {
  protected readonly path = '/checks/waler';
  protected readonly example = walerExample;
}
