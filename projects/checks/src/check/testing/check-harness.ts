import { ElementHarness, wordsOf } from '../../../testing/element-harness';
import { AnswerPanelHarness } from '../../answer/testing/answer-panel-harness';
import { SectionPickerHarness } from '../../section-picker/testing/section-picker-harness';

/** The whole sheet of a check. */
export class CheckHarness extends ElementHarness {
  get answer(): AnswerPanelHarness {
    return new AnswerPanelHarness(this.part('htc-answer-panel'));
  }

  get section(): SectionPickerHarness {
    return new SectionPickerHarness(this.part('htc-section-picker'));
  }

  /** Whether a field with a label is there. */
  has(label: string): boolean {
    const labels = Array.from(this.host.querySelectorAll('label'), (one) => wordsOf(one));
    return labels.some((text) => text.startsWith(label));
  }

  /** The cells of a table by rows, heads left out. */
  rows(heading: string): string[] {
    const table = Array.from(this.host.querySelectorAll('htc-points-table')).find((one) =>
      one.textContent.includes(heading),
    );
    return Array.from(table?.querySelectorAll('tbody tr') ?? [], (row) => wordsOf(row));
  }

  protected part(selector: string): Element {
    const part = this.host.querySelector(selector);
    if (!part) throw new Error(`There is no ${selector}.`);
    return part;
  }
}
