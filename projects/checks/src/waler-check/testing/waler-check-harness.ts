import { ElementHarness } from '../../../testing/element-harness';
import { AnswerPanelHarness } from '../../answer/testing/answer-panel-harness';
import { LoadTableHarness } from '../../load-table/testing/load-table-harness';
import { SectionPickerHarness } from '../../section-picker/testing/section-picker-harness';

/** The whole sheet of a waler. */
export class WalerCheckHarness extends ElementHarness {
  get answer(): AnswerPanelHarness {
    return new AnswerPanelHarness(this.part('htc-answer-panel'));
  }

  get loads(): LoadTableHarness {
    return new LoadTableHarness(this.part('htc-load-table'));
  }

  get section(): SectionPickerHarness {
    return new SectionPickerHarness(this.part('htc-section-picker'));
  }

  private part(selector: string): Element {
    const part = this.host.querySelector(selector);
    if (!part) throw new Error(`There is no ${selector}.`);
    return part;
  }
}
