import { ChangeDetectionStrategy, Component } from '@angular/core';
import { SectionCheck, type SectionRequest } from '@headtree/checks';
import { CheckHead } from './check-head';
import { sectionExample } from './example';
import { RequestPage } from './request-page';

/** The library's cross-section check on a page of the console. */
@Component({
  selector: 'app-section-page',
  imports: [CheckHead, SectionCheck],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-check-head
      heading="Cross-section check"
      [link]="link()"
      [unreadable]="unreadable"
      (filledIn)="fillIn()"
    />
    <htc-section
      class="check"
      credentials="session"
      [value]="request()"
      (valueChange)="keep($event)"
    />
  `,
  styleUrl: './check-page.scss',
})
export class SectionPage extends RequestPage<SectionRequest> {
  protected readonly path = '/checks/section';
  protected readonly example = sectionExample;
}
