import { ChangeDetectionStrategy, Component, input, ViewEncapsulation } from '@angular/core';
import type { CheckStatus } from '../contract';

/** What the mark stands for: a status, or why there is none. */
export type MarkKind = CheckStatus | 'none' | 'busy' | 'refused' | 'away';

/** The shape of a status; a word always stands beside it. */
@Component({
  selector: 'htc-status-mark',
  template: `
    <svg
      viewBox="0 0 26 26"
      aria-hidden="true"
      fill="none"
      stroke="currentColor"
      stroke-width="2.2"
    >
      @switch (kind()) {
        @case ('pass') {
          <circle cx="13" cy="13" r="11.5" fill="currentColor" stroke="none" />
          <path d="M7.6 13.4l3.6 3.7 7.2-7.6" stroke="var(--ht-sheet)" />
        }
        @case ('fail') {
          <path d="M13 .8L25.2 13 13 25.2.8 13z" fill="currentColor" stroke="none" />
          <path d="M9.4 9.4l7.2 7.2m0-7.2l-7.2 7.2" stroke="var(--ht-sheet)" />
        }
        @case ('incomplete') {
          <circle cx="13" cy="13" r="10.9" />
          <path d="M13 2.1a10.9 10.9 0 010 21.8z" fill="currentColor" stroke="none" />
        }
        @case ('provisional') {
          <circle cx="13" cy="13" r="10.9" stroke-dasharray="4.9 3.66" />
        }
        @case ('busy') {
          <path d="M13 2.1A10.9 10.9 0 0123.9 13" />
          <circle cx="13" cy="13" r="10.9" opacity=".25" />
        }
        @case ('refused') {
          <circle cx="13" cy="13" r="10.9" />
          <path d="M5.3 20.7L20.7 5.3" />
        }
        @case ('away') {
          <path d="M9 2.9a10.9 10.9 0 1010.5 1.4M13 7v6.6M13 16.6v2.4" />
        }
        @default {
          <circle cx="13" cy="13" r="10.9" stroke-width="1.2" />
        }
      }
    </svg>
  `,
  host: { '[class]': "'ht-mark ht-mark-' + kind()" },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class StatusMark {
  readonly kind = input.required<MarkKind>();
}
