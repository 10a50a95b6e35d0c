import { CheckHarness } from '../../check/testing/check-harness';
import { LoadTableHarness } from '../../load-table/testing/load-table-harness';

/** The whole sheet of a waler. */
export class WalerCheckHarness extends CheckHarness {
  get loads(): LoadTableHarness {
    return new LoadTableHarness(this.part('htc-load-table'));
  }
}
