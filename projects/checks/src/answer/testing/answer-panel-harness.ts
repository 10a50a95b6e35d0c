import { ElementHarness, tidy, wordsOf } from '../../../testing/element-harness';

/** The answer in the margin, as it is read. */
export class AnswerPanelHarness extends ElementHarness {
  /** "Pass", "Fail", "Not checked yet" … */
  get status(): string {
    return tidy(this.host.querySelector('[role="status"]')?.textContent);
  }

  /** The kinds of shapes and bars that are shown, as they are named for the eye. */
  get tones(): string[] {
    const bars = Array.from(this.host.querySelectorAll('htc-utilisation-bar'));
    return bars.map((bar) => /ht-bar-(pass|fail|none)/.exec(bar.className)?.[1] ?? '');
  }

  get mark(): string {
    const mark = this.host.querySelector('htc-status-mark')?.className ?? '';
    return /ht-mark-(\w+)/.exec(mark)?.[1] ?? '';
  }

  get verifications(): string[] {
    const list = this.host.querySelectorAll('[aria-label="Verifications"] > li');
    return Array.from(list, (one) => wordsOf(one));
  }
}
