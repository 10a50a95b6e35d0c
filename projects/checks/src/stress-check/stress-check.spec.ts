import { CheckBench } from '../../testing/check-bench';
import { sectionAnswerOf, statesAnswerOf } from '../../testing/section-answers';
import { CheckHarness } from '../check/testing/check-harness';
import { ElementHarness, wordsOf } from '../../testing/element-harness';
import type { StressRequest } from '../contract';
import { StressCheck } from './stress-check';

const states = {
  material: { type: 'steel', grade: 'S275' },
  states: [
    { sigmaX: 100, tau: 20 },
    { sigmaX: '180 MPa', sigmaZ: -40, tau: 65 },
  ],
} as unknown as StressRequest;

const section = {
  material: { type: 'steel', fy: 275 },
  section: 'UB 457x191x67',
  effects: { tension: 120, My: 180 },
} as unknown as StressRequest;

describe('the stress check', () => {
  beforeEach(() => jest.useFakeTimers());
  afterEach(() => jest.useRealTimers());

  let bench: CheckBench<StressRequest, StressCheck>;
  async function shown(value: StressRequest | null, answer = statesAnswerOf()) {
    bench = new CheckBench<StressRequest, StressCheck>(StressCheck, value);
    bench.reply = { answer };
    document.body.append(bench.host);
    await bench.pass();
    return new CheckHarness(bench.host);
  }
  afterEach(() => bench.host.remove());

  const rows = () => Array.from(bench.host.querySelectorAll('.ht-state'));
  const row = (index: number) => new ElementHarness(rows()[index] ?? bench.host);
  const choose = (label: string) => {
    const labels = Array.from(bench.host.querySelectorAll('fieldset label'));
    labels
      .find((one) => one.textContent.includes(label))
      ?.querySelector('input')
      ?.click();
    return bench.pass();
  };

  it('says what it wants in either way, and sends nothing', async () => {
    const sheet = await shown(null);
    expect(sheet.answer.text).toContain('Give a section, a steel grade and a design effect.');
    await choose('states of stress');
    expect(sheet.answer.text).toContain('Give a steel grade and a state of stress.');
    expect(bench.sent).toEqual([]);
  });

  it('sends its states as they came and shows which governs', async () => {
    const sheet = await shown(states);
    expect([bench.asked.at(-1), bench.sent.at(-1)]).toEqual(['stress', states]);
    expect(sheet.answer.text).toContain('Von Mises’ criterion governs state 2');
    expect(sheet.rows('States of stress')).toEqual([
      'state 1 105.8 100.0 0.0 20.0',
      'state 2 governs 212.3 180.0 −40.0 65.0',
    ]);
    expect(sheet.images).toEqual([]);
  });

  it('adds a state, goes to it, and takes one out', async () => {
    const sheet = await shown(states);
    sheet.press('Add state');
    await bench.pass();
    expect(rows()).toHaveLength(3);
    expect(rows()[2]?.contains(document.activeElement)).toBe(true);
    row(2).write('Stress along the member', '-12,5');
    await bench.pass();
    expect(bench.sent.at(-1)?.states?.[2]).toEqual({ sigmaX: -12.5 });
    sheet.press('Remove state 1');
    await bench.pass();
    expect(bench.sent.at(-1)?.states).toHaveLength(2);
    expect(document.activeElement?.getAttribute('aria-label')).toBe('Remove state 1');
  });

  it('numbers its states as the answer does, empty rows left out', async () => {
    await shown(states);
    for (const name of ['Stress along the member', 'Stress across the member', 'Shear stress'])
      row(0).write(name, '');
    await bench.pass();
    const numbers = Array.from(bench.host.querySelectorAll('.ht-state-number'), wordsOf);
    expect(numbers).toEqual(['–', '1']);
    expect(rows()[1]?.getAttribute('aria-label')).toBe('State 1');
  });

  it('goes down with Enter, and on the last row writes a new one', async () => {
    await shown(states);
    const enter = (index: number) => {
      const field = row(index).field('Shear stress');
      field.focus();
      const event = { key: 'Enter', bubbles: true, cancelable: true };
      field.dispatchEvent(new KeyboardEvent('keydown', event));
      return bench.pass();
    };
    await enter(0);
    expect(document.activeElement).toBe(row(1).field('Shear stress'));
    await enter(1);
    expect(rows()).toHaveLength(3);
  });

  it('points at the state that is refused, rows with nothing in them left out', async () => {
    const sheet = await shown(states);
    sheet.press('Add state');
    await bench.pass();
    row(2).write('Shear stress', 'x');
    await bench.pass();
    expect(row(2).fault('Shear stress')).toContain('Give a number');
    bench.reply = { problem: [{ pointer: '/states/1/sigmaZ', message: 'Too much.', code: 'x' }] };
    row(2).write('Shear stress', '');
    await bench.pass();
    expect(row(1).fault('Stress across the member')).toBe('Too much.');
  });

  it('sends a section with its effects, and draws its stress and where it governs', async () => {
    const [made] = statesAnswerOf().verifications;
    const verifications = made ? [{ ...made, point: 'junction-top' }] : [];
    const answer = sectionAnswerOf({
      check: 'stress',
      governing: 'von-mises',
      utilisation: 0.97,
      verifications,
      interaction: [],
    });
    const sheet = await shown(section, answer);
    expect(bench.sent.at(-1)).toEqual(section);
    expect(sheet.answer.text).toContain('Von Mises’ criterion governs flange-web junction, top');
    expect(sheet.images[1]).toContain('Stress along the member in N/mm²');
    expect(sheet.text).toContain('Ringed: the point that governs.');
    expect(sheet.rows('named points')[3]).toContain('flange-web junction, top governs');
  });

  it('says by its name what was not verified', async () => {
    const missing = [
      { pointer: '/section', verification: 'von-mises', reason: 'Class 4.' },
    ] as const;
    const sheet = await shown(section, sectionAnswerOf({ status: 'incomplete', missing }));
    expect(sheet.answer.text).toContain('Not verified: von Mises’ criterion.');
  });

  it('sends one way or the other, never both', async () => {
    const sheet = await shown(section);
    await choose('states of stress');
    row(0).write('Stress along the member', '200');
    await bench.pass();
    expect(bench.sent.at(-1)).toEqual({
      material: section.material,
      states: [{ sigmaX: 200 }],
    });
    await choose('a section');
    expect(bench.sent.at(-1)).toEqual(section);
    expect(sheet.section.input.value).toBe('UB 457x191x67');
  });
});
