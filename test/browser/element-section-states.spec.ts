import { startBench, type Bench } from './support/browser';
import { describeStates } from './support/describe-states';
import { sectionStates } from './support/section-states';

/** Each state of the cross-section and of the stress, for those who see, hear or enlarge it. */
let bench: Bench;
beforeAll(async () => {
  bench = await startBench();
});
afterAll(() => bench.stop());

describeStates(sectionStates, () => bench);
