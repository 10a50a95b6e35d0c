import { CheckBench } from '../../testing/check-bench';
import { sectionAnswerOf } from '../../testing/section-answers';
import { CheckHarness } from '../check/testing/check-harness';
import type { ApiError } from '../api/api-error';
import type { SectionRequest } from '../contract';
import { SectionCheck } from './section-check';

const atProp: SectionRequest = {
  profile: 'uk-na',
  material: { type: 'steel', grade: 'S275' },
  section: 'UB 457x191x67',
  effects: { compression: 250, My: 180, Vz: 300 },
};

const mm = (value: number) => ({ value });
const ub = {
  designation: 'UB 457x191x67',
  shape: 'I',
  dimensions: { h: mm(453.4), b: mm(189.9), tw: mm(8.5), tf: mm(12.7), r: mm(10.2) },
};

describe('the cross-section check', () => {
  beforeEach(() => jest.useFakeTimers());
  afterEach(() => jest.useRealTimers());

  let bench: CheckBench<SectionRequest, SectionCheck>;
  async function shown(value: SectionRequest | null, inputs: object = {}) {
    bench = new CheckBench<SectionRequest, SectionCheck>(SectionCheck, value, inputs);
    bench.reply = { answer: sectionAnswerOf() };
    bench.sections = [ub];
    await bench.pass();
    return new CheckHarness(bench.host);
  }

  it('says what it wants while it is empty, and sends nothing', async () => {
    const sheet = await shown(null);
    expect(sheet.answer.status).toBe('Not checked yet');
    expect(sheet.answer.text).toContain('Give a section, a steel grade and a design effect.');
    expect(bench.sent).toEqual([]);
    expect(sheet.text).toContain('For competent persons');
  });

  it('checks what it is given and shows the answer with its figures', async () => {
    const sheet = await shown(atProp);
    expect([bench.asked.at(-1), bench.sent.at(-1)]).toEqual(['section', atProp]);
    expect(sheet.answer.status).toBe('Pass');
    expect(sheet.answer.text).toContain('Bending about y-y with axial force governs');
    const [section, sigma, tau, curve] = sheet.images;
    expect(section).toContain('UB 457x191x67 to scale, in mm: h 453.4, b 189.9, tf 12.7');
    expect(section).toContain('Hatched: not effective under N.');
    expect(sigma).toContain('Stress along the member in N/mm²: top flange −164; web −160 to +102');
    expect(tau).toContain('Shear stress in N/mm²: top flange 0.0 to 18.0');
    expect(curve).toBe(
      'Bending about y-y with axial force: what acts is inside the curve. ' +
        'Acts: M y,Ed 180 kN m with N Ed 250 kN. At most M y,Ed 404.5 kN m, N Ed 2351 kN.',
    );
    expect(sheet.rows('named points')).toContain('web centre 152.0 −29.2 86.1 0.0 0.0');
  });

  it('draws the section from the catalogue before there is an answer', async () => {
    const sheet = await shown({ ...atProp, effects: {} });
    expect(bench.sent).toEqual([]);
    expect(sheet.images[0]).toContain('UB 457x191x67 to scale, in mm: h 453.4, b 189.9');
  });

  it('takes a unit and a decimal comma and gives out dot-decimal JSON', async () => {
    const sheet = await shown(atProp);
    const given: SectionRequest[] = [];
    bench.check.valueChange.subscribe((value) => given.push(value));
    sheet.write('My', '−182,5');
    await bench.pass();
    sheet.write('Mz', '12 kip ft');
    sheet.write('B, bimoment', '3 kNm²');
    await bench.pass();
    expect(bench.sent.at(-1)?.effects).toEqual({
      compression: 250,
      My: -182.5,
      Mz: '12 kip ft',
      Vz: 300,
      bimoment: 3,
    });
    expect(given.at(-1)).toEqual(bench.sent.at(-1));
  });

  /** What the check tells, in order; a request by its profile and its My. */
  function told(): unknown[] {
    const list: unknown[] = [];
    bench.check.valueChange.subscribe((value) => list.push([value.profile, value.effects.My]));
    bench.check.unread.subscribe(() => list.push(null));
    bench.check.result.subscribe(({ status }) => list.push(status));
    return list;
  }

  it('tells once that nothing can be sent any more, and again when it can', async () => {
    const sheet = await shown(atProp);
    const list = told();
    for (const text of ['abc', 'abcd', '180']) {
      sheet.write('My', text);
      await bench.pass();
    }
    expect(list).toEqual([null, ['uk-na', 180], 'pass']);
  });

  it('tells so while a designation is half typed, and answers again when it is left', async () => {
    const sheet = await shown(atProp);
    bench.sections = [ub, { ...ub, designation: 'UB 457x191x74' }];
    const list = told();
    sheet.section.write('Section', 'UB 457');
    await bench.pass();
    expect(list).toEqual([null]);
    expect(sheet.answer.status).toBe('Not checked yet');
    expect(sheet.answer.text).toContain('Give a section. The answer stands here as soon as it is');
    sheet.section.write('Section', 'UB 457x191x67');
    sheet.section.leave();
    await bench.pass();
    expect(list).toEqual([null, ['uk-na', 180], 'pass']);
  });

  it('lets what is half typed go on reset', async () => {
    const sheet = await shown(null);
    bench.sections = [ub, { ...ub, designation: 'UB 457x191x74' }];
    sheet.section.write('Section', 'UB 4');
    await bench.pass();
    expect(sheet.section.options).toHaveLength(2);
    bench.check.reset();
    await bench.pass();
    expect([sheet.section.input.value, sheet.section.options]).toEqual(['', []]);
  });

  it('tells of another factor profile as of any change', async () => {
    const sheet = await shown(atProp);
    const list = told();
    const select = bench.host.querySelector<HTMLSelectElement>('.ht-factors select');
    if (select) select.value = '';
    select?.dispatchEvent(new Event('change'));
    await bench.pass();
    expect(list).toEqual([[undefined, 180], 'pass']);
    expect(sheet.answer.status).toBe('Pass');
  });

  it('wants a factor profile from a person, and sends nothing without', async () => {
    const sheet = await shown({ ...atProp, profile: undefined } as never, {
      credentials: 'session',
      apiKey: '',
    });
    expect(sheet.answer.text).toContain('Give a factor profile.');
    expect(bench.sent).toEqual([]);
  });

  it('is empty again when it is given null', async () => {
    const sheet = await shown(atProp);
    sheet.write('My', '20');
    await bench.pass();
    bench.fixture.componentRef.setInput('value', null);
    await bench.pass();
    expect([sheet.field('My').value, sheet.section.input.value]).toEqual(['', '']);
  });

  it('gives an axial force as compression or tension, never with a sign', async () => {
    const sheet = await shown(atProp);
    sheet.write('Axial force', 'tension');
    await bench.pass();
    expect(bench.sent.at(-1)?.effects).toEqual({ tension: 250, My: 180, Vz: 300 });
    sheet.write('N, tension', '-250');
    await bench.pass();
    expect(sheet.fault('N, tension')).toContain('choose compression or tension');
    expect(sheet.answer.status).toBe('Not checked');
  });

  it('takes a section by its dimensions, begun from the one that was named', async () => {
    const sheet = await shown(atProp);
    sheet.write('Section by', 'welded');
    await bench.pass();
    expect(sheet.field('h, depth').value).toBe('453.4');
    sheet.write('h, depth', '600');
    sheet.write('weld, leg', '6');
    await bench.pass();
    expect(bench.sent.at(-1)?.section).toEqual({
      shape: 'I',
      h: 600,
      b: 189.9,
      tw: 8.5,
      tf: 12.7,
      r: 6,
      fabrication: 'welded',
    });
  });

  it('asks for the dimension that is wanting beside its field', async () => {
    const sheet = await shown({
      ...atProp,
      section: { shape: 'RHS', h: 250, b: 150, t: 8, forming: 'cold-formed' },
    });
    expect(sheet.field('Section by').value).toBe('RHS cold');
    sheet.write('t, walls', '');
    await bench.pass();
    expect(sheet.fault('t, walls')).toBe('Give a value.');
    expect(sheet.answer.text).toMatch(/marked beside its field|marked beside their fields/);
    expect(sheet.answer.text).not.toContain('cannot be read');
  });

  it('shows the parts of a torsion on open sections, and wherever one is typed', async () => {
    const sheet = await shown(atProp);
    expect(sheet.has('T, St Venant part')).toBe(true);
    sheet.write('Section by', 'CHS hot');
    await bench.pass();
    expect(sheet.has('T, torsion')).toBe(true);
    expect(sheet.has('T, St Venant part')).toBe(false);
    sheet.write('Section by', 'designation');
    await bench.pass();
    sheet.write('T, warping part', '2');
    sheet.write('Section by', 'CHS hot');
    await bench.pass();
    expect(sheet.has('T, warping part')).toBe(true);
  });

  it('keeps what the form does not show, until the section is another', async () => {
    const twin: SectionRequest = {
      ...atProp,
      material: { type: 'timber', class: 'C24', serviceClass: 2, loadDuration: 'short-term' },
      section: { designation: 'UB 457x191x67', count: 2, properties: { Iy: 1 } },
      netArea: '80 cm²',
    };
    const sheet = await shown(twin);
    sheet.write('My', '12');
    await bench.pass();
    expect(bench.sent.at(-1)).toEqual({ ...twin, effects: { ...twin.effects, My: 12 } });
    sheet.section.write('Section', 'UC 254x254x89');
    sheet.section.leave();
    await bench.pass();
    expect(bench.sent.at(-1)?.section).toEqual({ designation: 'UC 254x254x89', count: 2 });
  });

  it('puts what the service refuses beside its field', async () => {
    const sheet = await shown(atProp);
    const item = (pointer: string, message: string) => ({ pointer, message, code: 'x' });
    bench.reply = {
      problem: [
        item('/effects/T', 'Torsion on an open section needs its parts.'),
        item('/section/designation', 'No such section.'),
        item('/material', 'No such steel.'),
        item('/pattern', 'Unknown.'),
      ],
    };
    sheet.write('T, torsion', '5');
    await bench.pass();
    expect(sheet.fault('T, torsion')).toBe('Torsion on an open section needs its parts.');
    expect(sheet.section.fault('Section')).toBe('No such section.');
    expect(sheet.fault('Steel')).toBe('No such steel.');
    expect(sheet.answer.text).toContain('Unknown. /pattern');
  });

  it('never shows an old answer as that of the form', async () => {
    const sheet = await shown(atProp);
    expect(sheet.answer.tones).toContain('pass');
    sheet.write('My', '900');
    await bench.pass(10);
    expect(sheet.answer.status).toBe('Checking…');
    expect(sheet.answer.tones).not.toContain('pass');
  });

  it('keeps everything while the service is away and answers when it is back', async () => {
    const sheet = await shown(atProp);
    bench.reply = 'away';
    sheet.write('My', '200');
    await bench.pass();
    expect([sheet.answer.status, sheet.field('My').value]).toEqual(['Service away', '200']);
    bench.reply = { answer: sectionAnswerOf() };
    await bench.pass(2000);
    expect(sheet.answer.status).toBe('Pass');
  });

  it('refuses a secret key and sends nothing', async () => {
    const sheet = await shown(atProp, { apiKey: 'htk_secret' });
    const errors: ApiError[] = [];
    bench.check.failed.subscribe((error) => errors.push(error));
    void bench.check.check();
    await bench.pass();
    expect(bench.sent).toEqual([]);
    expect(errors[0]?.kind).toBe('secret-key');
    expect(sheet.answer.text).toContain('nothing was sent');
  });

  it('checks when told to, and goes back to what it was given', async () => {
    const sheet = await shown(atProp);
    const checked = bench.check.check();
    await bench.pass(1);
    await expect(checked).resolves.toMatchObject({ utilisation: 0.79 });
    sheet.write('My', '900');
    await bench.pass();
    bench.check.reset();
    await bench.pass();
    expect(sheet.field('My').value).toBe('180');
  });

  it('can be read without being changed', async () => {
    const sheet = await shown(atProp, { readonly: true });
    expect((sheet.field('My') as HTMLInputElement).readOnly).toBe(true);
    expect(sheet.field('Steel').disabled).toBe(true);
  });
});
