import { answerOf } from '../../testing/answers';
import { CheckBench, type Reply } from '../../testing/check-bench';
import type { ApiError } from '../api/api-error';
import type { WalerRequest } from '../contract';
import { WalerCheckHarness } from './testing/waler-check-harness';
import { WalerCheck } from './waler-check';

const northFace: WalerRequest = {
  profile: 'uk-na',
  material: { type: 'steel', grade: 'S275' },
  section: 'UB 457x191x67',
  loadBasis: 'characteristic',
  spans: [3, 3],
  loads: [{ name: 'earth', nature: 'permanent', kind: 'uniform', value: 95 }],
  lossOfProp: [1],
};

describe('the waler check', () => {
  beforeEach(() => jest.useFakeTimers());
  afterEach(() => jest.useRealTimers());

  let reply: Reply;
  let bench: CheckBench<WalerRequest, WalerCheck>;
  const pass = (ms?: number) => {
    bench.reply = reply;
    return bench.pass(ms);
  };

  async function shown(value: WalerRequest | null, inputs: object = {}) {
    bench = new CheckBench<WalerRequest, WalerCheck>(WalerCheck, value, inputs);
    await pass();
    return new WalerCheckHarness(bench.host);
  }

  it('says what it wants while it is empty, and sends nothing', async () => {
    const sheet = await shown(null);
    expect(sheet.answer.status).toBe('Not checked yet');
    expect(sheet.answer.text).toContain('Give a section, a steel grade, spans and a load.');
    expect(bench.sent).toEqual([]);
    expect(sheet.text).toContain('For competent persons');
  });

  it('checks what it is given and shows the answer', async () => {
    reply = { answer: answerOf() };
    const sheet = await shown(northFace);
    expect(bench.sent).toEqual([northFace]);
    expect(sheet.answer.status).toBe('Pass');
    expect(sheet.answer.text).toContain('0.87');
    expect(sheet.text).toContain('uk-na@2');
    expect(sheet.text).toContain('not kept');
    expect(sheet.images[0]).toBe(
      'Waler over 3 props, spans 3, 3 m. Loads: earth 95 kN/m all along.',
    );
    expect(sheet.images[1]).toContain(
      'Bending moment in kN m: span 1 from −118.6 at 3.00 m to 84.2',
    );
  });

  it('gives out dot-decimal JSON and keeps what the form does not show', async () => {
    reply = { answer: answerOf() };
    const sheet = await shown(northFace);
    const given: WalerRequest[] = [];
    bench.check.valueChange.subscribe((value) => given.push(value));
    sheet.write('Spans', '3,5 m + 2400 mm');
    await pass();
    expect(given).toEqual([{ ...northFace, spans: [3.5, '2400 mm'] }]);
    expect(bench.sent.at(-1)).toEqual(given[0]);
  });

  it('leaves what is typed alone when its own value comes back', async () => {
    reply = { answer: answerOf() };
    const sheet = await shown(northFace);
    bench.check.valueChange.subscribe((value) =>
      bench.fixture.componentRef.setInput('value', value),
    );
    sheet.write('Spans', '3,50+2,40');
    await pass();
    expect(sheet.field('Spans').value).toBe('3,50+2,40');
    bench.fixture.componentRef.setInput('value', northFace);
    await pass();
    expect(sheet.field('Spans').value).toBe('3.0 + 3.0');
  });

  it('asks beside the field which number is meant, and takes the choice', async () => {
    reply = { answer: answerOf() };
    const sheet = await shown(northFace);
    sheet.write('Bearing at props', '1,234');
    await pass();
    expect(sheet.fault('Bearing at props')).toContain('two ways');
    expect(sheet.answer.status).toBe('Not checked');
    sheet.press('1.234 m');
    await pass();
    expect(sheet.fault('Bearing at props')).toBe('');
    expect(bench.sent.at(-1)?.bearing).toEqual({ length: 1.234 });
  });

  it('puts what the service refuses beside its field, and the rest at the top of the answer', async () => {
    reply = {
      problem: [
        { pointer: '/spans/1', code: 'too-long', message: 'The span is too long.' },
        { pointer: '/loads/0/value', code: 'too-large', message: 'The load is too large.' },
        { pointer: '/lossOfProp', code: 'not-covered', message: 'Loss of a prop is not covered.' },
      ],
    };
    const sheet = await shown(northFace);
    expect(sheet.fault('Spans')).toBe('The span is too long.');
    expect(sheet.loads.row(0).fault('Value')).toBe('The load is too large.');
    expect(sheet.answer.status).toBe('Not checked');
    expect(sheet.answer.text).toContain('Loss of a prop is not covered. /lossOfProp');
  });

  it('keeps everything while the service is away and answers when it is back', async () => {
    reply = 'away';
    const sheet = await shown(northFace);
    sheet.write('Spans', '4 + 4');
    await pass();
    expect(sheet.answer.status).toBe('Service away');
    expect(sheet.field('Spans').value).toBe('4 + 4');
    reply = { answer: answerOf() };
    await pass(2000);
    expect(sheet.answer.status).toBe('Pass');
    expect(bench.sent.at(-1)?.spans).toEqual([4, 4]);
  });

  it('never shows an old answer as that of the form', async () => {
    reply = { answer: answerOf() };
    const sheet = await shown(northFace);
    expect(sheet.answer.tones).toContain('pass');
    sheet.write('Spans', '9 + 9');
    bench.fixture.detectChanges();
    await jest.advanceTimersByTimeAsync(10);
    bench.fixture.detectChanges();
    expect(sheet.answer.status).toBe('Checking…');
    expect(sheet.answer.tones).not.toContain('pass');
  });

  it('refuses a secret key and sends nothing', async () => {
    const errors: ApiError[] = [];
    const sheet = await shown(northFace, { apiKey: 'htk_secret' });
    bench.check.failed.subscribe((error) => errors.push(error));
    void bench.check.check();
    await pass();
    expect(bench.sent).toEqual([]);
    expect(errors[0]?.kind).toBe('secret-key');
    expect(sheet.answer.text).toContain('nothing was sent');
  });

  it('checks when told to, and goes back to what it was given', async () => {
    reply = { answer: answerOf({ utilisation: 0.5 }) };
    const sheet = await shown(northFace);
    const checked = bench.check.check();
    await pass(1);
    await expect(checked).resolves.toMatchObject({ utilisation: 0.5 });
    sheet.write('Spans', '9 + 9');
    await pass();
    bench.check.reset();
    await pass();
    expect(sheet.field('Spans').value).toBe('3.0 + 3.0');
  });

  it('writes a new load and sends it', async () => {
    reply = { answer: answerOf() };
    const sheet = await shown(northFace);
    sheet.press('Add load');
    await pass();
    const row = sheet.loads.row(1);
    row.write('Name of the load', 'crane');
    await pass(0);
    row.write('Nature', 'variable');
    await pass(0);
    row.write('Category', 'construction');
    row.write('Shape', 'point');
    await pass(0);
    row.write('Value', '40');
    await pass(0);
    row.write('Place', '1,5');
    await pass();
    expect(bench.sent.at(-1)?.loads?.[1]).toEqual({
      name: 'crane',
      nature: 'variable',
      category: 'construction',
      kind: 'point',
      value: 40,
      at: 1.5,
    });
  });
});
