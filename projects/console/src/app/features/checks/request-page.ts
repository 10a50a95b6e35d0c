import { DOCUMENT, Directive, inject, signal } from '@angular/core';
import { Location } from '@angular/common';
import { adoptSheetStyles } from '@headtree/checks';
import { fromFragment, toFragment } from './request-in-address';

/** A page of one check, under the session; the address carries what was asked. */
@Directive()
export abstract class RequestPage<Request extends object> {
  private readonly document = inject(DOCUMENT);
  private readonly location = inject(Location);

  private readonly carried = this.document.location.hash.slice(1);
  protected readonly request = signal(fromFragment(this.carried) as Request | null);
  protected readonly unreadable = this.carried.startsWith('r=') && this.request() === null;
  protected readonly link = signal(this.request() ? this.document.location.href : null);

  /** Where the page is. */
  protected abstract readonly path: string;
  protected abstract readonly example: Request;

  constructor() {
    adoptSheetStyles(this.document);
  }

  protected fillIn(): void {
    this.request.set(this.example);
    this.keep(this.example);
  }

  protected keep(request: Request): void {
    const address = `${this.path}#${toFragment(request)}`;
    // Not a navigation: nothing is loaded and the focus stays in its field.
    this.location.replaceState(address);
    this.link.set(new URL(address, this.document.location.origin).href);
  }
}
