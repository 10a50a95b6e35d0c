import { startBench, type Bench } from './support/browser';
import { describeStates } from './support/describe-states';
import { answerOf, waler } from './support/element';
import { states } from './support/states';

/** Each state, for those who see, hear or enlarge it. */
let bench: Bench;
beforeAll(async () => {
  bench = await startBench();
});
afterAll(() => bench.stop());

describeStates(states, () => bench);

it('says beside its status what was waived and why', async () => {
  const page = await bench.open(states.pass?.options);
  await answerOf(page);
  const panel = (await waler(page).locator('.ht-margin').textContent()) ?? '';
  expect(panel).toMatch(/Waived, not verified: transverse force.*stiffeners at every prop/);
  expect(panel).not.toContain('Everything this check owes was verified');
});
