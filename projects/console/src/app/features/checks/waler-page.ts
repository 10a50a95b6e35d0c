import { ChangeDetectionStrategy, Component, DOCUMENT, inject, signal } from '@angular/core';
import { Location } from '@angular/common';
import { adoptSheetStyles, WalerCheck } from '@headtree/checks';
import { CopyButton } from '../../shared/copy-button';
import { PageHead } from '../../shared/page-head';
import { exampleRequest } from './example';
import { fromFragment, toFragment, type WalerRequest } from './request-in-address';

const path = '/checks/waler';

/** The library's waler check, under the session; the address carries what was asked. */
@Component({
  selector: 'app-waler-page',
  imports: [CopyButton, PageHead, WalerCheck],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './waler-page.html',
  styleUrl: './waler-page.scss',
})
export class WalerPage {
  private readonly document = inject(DOCUMENT);
  private readonly location = inject(Location);

  private readonly carried = this.document.location.hash.slice(1);
  protected readonly request = signal(fromFragment(this.carried));
  protected readonly unreadable = this.carried.startsWith('r=') && this.request() === null;
  protected readonly link = signal(this.request() ? this.document.location.href : null);

  constructor() {
    adoptSheetStyles(this.document);
  }

  protected fillIn(): void {
    this.request.set(exampleRequest);
    this.keep(exampleRequest);
  }

  protected keep(request: WalerRequest): void {
    const address = `${path}#${toFragment(request)}`;
    // Not a navigation: nothing is loaded and the focus stays in its field.
    this.location.replaceState(address);
    this.link.set(new URL(address, this.document.location.origin).href);
  }
}
