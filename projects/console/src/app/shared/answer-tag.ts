import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

export type Standing = 'pass' | 'fail' | 'incomplete' | 'provisional' | 'refused' | 'plain';

/** An answer as a word and a shape: never a colour alone. */
@Component({
  selector: 'app-answer-tag',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <svg viewBox="0 0 10 10" width="10" height="10" aria-hidden="true" focusable="false">
      @switch (standing()) {
        @case ('pass') {
          <circle cx="5" cy="5" r="4" fill="currentColor" />
        }
        @case ('fail') {
          <path d="M5 0 10 5 5 10 0 5z" fill="currentColor" />
        }
        @case ('incomplete') {
          <circle cx="5" cy="5" r="4" fill="none" stroke="currentColor" stroke-width="1.5" />
          <path d="M5 1a4 4 0 0 1 0 8z" fill="currentColor" />
        }
        @case ('provisional') {
          <circle
            cx="5"
            cy="5"
            r="4"
            fill="none"
            stroke="currentColor"
            stroke-width="1.6"
            stroke-dasharray="2.1 1.49"
          />
        }
        @case ('refused') {
          <path d="M1 4h8v2H1z" fill="currentColor" />
        }
        @default {
          <path d="M1 4.5h8v1H1z" fill="currentColor" />
        }
      }
    </svg>
    <span>{{ word() }}</span>
  `,
  styles: `
    :host {
      display: inline-flex;
      gap: 7px;
      align-items: baseline;
      color: var(--quiet);
      white-space: nowrap;
    }
    svg {
      flex: none;
      translate: 0 0.5px;
    }
    :host(.pass) {
      color: var(--pass);
    }
    :host(.fail) {
      color: var(--fail);
    }
    :host(.incomplete),
    :host(.provisional) {
      color: var(--warn);
    }
  `,
  host: { '[class]': 'standing()' },
})
export class AnswerTag {
  readonly standing = input.required<Standing>();
  /** Other words than the standing's own. */
  readonly words = input<string | null>(null);
  protected readonly word = computed(() => this.words() ?? this.standing());
}
