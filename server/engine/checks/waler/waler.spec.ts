import { create, all, type Unit } from 'mathjs';
import { publishedRevision } from '../../testing/profiles';
import { northFace, refusalOf, runWaler, uniform, verification } from '../../testing/waler';
import { waler } from './waler';
import type { WalerRequest } from '../contract';

if (!all) throw new Error('mathjs has no functions');
const math = create(all);

describe('a waler over three spans', () => {
  const answer = runWaler();

  test('takes its largest moment over an inner prop', () => {
    expect(verification(answer, 'bending-y').at).toEqual({ span: 2, x: 3, support: 2 });
  });

  test('passes when everything it owes was verified or waived', () => {
    expect(answer.status).toBe('pass');
    expect(answer.missing).toEqual([]);
    expect(answer.waived).toEqual(northFace.waive);
  });

  test('names the verification with the greatest utilisation', () => {
    const greatest = Math.max(
      ...answer.verifications.map(({ utilisation }) => utilisation ?? Infinity),
    );
    expect(answer.utilisation).toBe(greatest);
    expect(verification(answer, answer.governing ?? '').utilisation).toBe(greatest);
  });

  test('its props share the load: reactions by action sum to the load on the waler', () => {
    const earth = answer.reactions?.map(({ byAction }) =>
      byAction.find(({ name }) => name === 'earth'),
    );
    const total = (earth ?? []).reduce((sum, one) => sum + (one?.max ?? NaN), 0);
    expect(total).toBeCloseTo(95 * 8.4, 9);
  });

  test('every printed line of the working evaluates to its value', () => {
    const lines = (answer.steps ?? []).filter(({ kind }) => kind === 'formula');
    expect(lines.length).toBeGreaterThan(20);
    for (const { substituted, value, unit } of lines) {
      const result = math.evaluate(substituted) as number | Unit;
      const number = typeof result === 'number' ? result : result.toNumber(unit);
      expect(Math.abs(number - Number(value))).toBeLessThanOrEqual(
        1e-9 * Math.abs(Number(value)) + 1e-12,
      );
    }
  });

  test('a summary is the same answer without the working', () => {
    const { steps, combinations, diagrams, ...rest } = answer;
    expect(steps && combinations && diagrams).toBeTruthy();
    expect(runWaler({}, 'en-recommended', 'summary')).toEqual(rest);
  });
});

describe('what a waler owes', () => {
  test('without waivers a full-restraint waler is incomplete for the transverse force', () => {
    const answer = runWaler({ waive: [] });
    expect(answer.status).toBe('incomplete');
    expect(answer.missing.map((one) => one.verification)).toEqual(['transverse-force']);
  });

  test('held at the supports only, lateral torsional buckling is owed', () => {
    const answer = runWaler({ restraint: 'at-supports' });
    expect(answer.status).toBe('incomplete');
    expect(answer.missing.map((one) => one.verification)).toEqual(['lateral-torsional-buckling']);
  });

  test('restraint is at the supports unless the caller says otherwise', () => {
    const { restraint, ...rest } = northFace;
    expect(restraint).toBe('full');
    const answer = runWaler({ ...rest, restraint: 'at-supports' });
    expect(answer.missing[0]?.pointer).toBe('/restraint');
  });

  test('without a limit the deflection is owed', () => {
    const { deflectionLimit, ...rest } = northFace;
    expect(deflectionLimit).toBeDefined();
    const profile = publishedRevision('en-recommended');
    const answer = waler.run(rest, { profile, detail: 'summary' });
    expect(answer.missing).toEqual([
      expect.objectContaining({ pointer: '/deflectionLimit', verification: 'deflection' }),
    ]);
  });

  test('steel does not creep: a limit on the final deflection is held against the same', () => {
    const answer = runWaler({ deflectionLimit: { instant: 'span/200', final: 'span/99999' } });
    expect(verification(answer, 'deflection').status).toBe('pass');
    expect(verification(answer, 'deflection-final').status).toBe('fail');
  });

  test('strength is owed: loads of serviceability alone are never a pass', () => {
    const loads = uniform(1);
    const sets = (situation: 'serviceability' | 'accidental') => [
      { id: 's', situation, combination: 'none' as const, loads },
    ];
    expect(runWaler({ loadSets: sets('serviceability') }).status).toBe('incomplete');
    expect(runWaler({ loadSets: sets('accidental') }).status).toBe('incomplete');
  });

  test('design values say nothing of deflection', () => {
    const answer = runWaler({ loadBasis: 'design' });
    expect(answer.status).toBe('incomplete');
    expect(answer.missing.map((one) => one.verification)).toEqual(['deflection']);
  });

  test('a failure outranks what is missing', () => {
    expect(runWaler({ loads: uniform(900), waive: [] }).status).toBe('fail');
  });

  test('bending is not for the caller to waive', () => {
    const refusal = refusalOf({ waive: [{ verification: 'bending-y', reason: 'no' }] });
    expect(refusal.items[0]).toMatchObject({
      code: 'cannot-be-waived',
      pointer: '/waive/0/verification',
    });
  });
});

describe('props that only push', () => {
  const lifting = runWaler({
    spans: [6, 1.5],
    loads: uniform(95),
    loadBasis: 'design',
    selfWeight: false,
  });

  test('spans of 6.0 and 1.5 m under 95 kN/m lift the end prop: 376 kN m of sagging', () => {
    expect(verification(lifting, 'bending-y').effect.value).toBeCloseTo(267.1875 ** 2 / 190, 9);
    expect(lifting.combinations?.[0]?.lifted).toEqual([3]);
    expect(lifting.reactions?.[2]?.design.persistent?.max).toBe(0);
  });

  test('the answer says which prop is left', () => {
    expect(lifting.advisories.find(({ code }) => code === 'support-lifts')?.message).toContain(
      'prop 3',
    );
  });

  test('a load that pulls the waler off all of them is a mechanism, and fails', () => {
    const answer = runWaler({ loads: uniform(-5) });
    expect(answer.status).toBe('fail');
    expect(answer.utilisation).toBeNull();
    expect(answer.verifications[0]?.reason).toMatch(/mechanism/);
  });
});

describe('shear beside bending', () => {
  // A short span with a heavy load near the prop: shear above half of its resistance.
  const answer = runWaler({
    spans: [2, 2],
    loads: [{ name: 'pile', nature: 'permanent', kind: 'point', value: 700, at: 1.5 }],
    selfWeight: false,
    loadBasis: 'design',
  });

  test('above half of the shear resistance the moment resistance falls', () => {
    const { values } = verification(answer, 'bending-shear-y');
    const ratio = (values.V_z_Ed?.value ?? 0) / (values.V_pl_z_Rd?.value ?? 1);
    expect(ratio).toBeGreaterThan(0.5);
    expect(values.rho?.value).toBeCloseTo((2 * ratio - 1) ** 2, 12);
    expect(values.M_V_y_Rd?.value).toBeLessThan(values.M_c_y_Rd?.value ?? 0);
  });

  test('a waler with little shear is not verified for it', () => {
    expect(runWaler({ loads: uniform(20) }).verifications.map(({ id }) => id)).not.toContain(
      'bending-shear-y',
    );
  });
});

describe('two members side by side', () => {
  const twin = { designation: 'UB 457x191x67', count: 2 };

  test('each carries half, and the props carry both', () => {
    const single = runWaler({ selfWeight: false });
    const pair = runWaler({ section: twin, selfWeight: false });
    expect(pair.utilisation).toBeCloseTo((single.utilisation ?? NaN) / 2, 12);
    expect(pair.reactions?.[1]?.design.persistent?.max).toBeCloseTo(
      single.reactions?.[1]?.design.persistent?.max ?? NaN,
      9,
    );
  });

  test('deflect half as much as one', () => {
    const single = verification(runWaler(), 'deflection').effect.value;
    expect(verification(runWaler({ section: twin }), 'deflection').effect.value).toBeCloseTo(
      single / 2,
      9,
    );
  });

  test('unless connected, that they share is nowhere proved', () => {
    const codes = (connected: boolean) =>
      runWaler({ section: { ...twin, connected } }).advisories.map(({ code }) => code);
    expect(codes(false)).toContain('unequal-sharing');
    expect(codes(true)).not.toContain('unequal-sharing');
  });

  test('a share below the even one is refused', () => {
    expect(refusalOf({ section: { ...twin, share: 0.4 } }).code).toBe('share-too-small');
  });
});

describe('factors that nobody confirmed', () => {
  test('a grade whose strength is only recalled makes the answer provisional', () => {
    const answer = runWaler({
      material: { type: 'steel', grade: 'S460' },
      section: 'UC 305x305x158',
    });
    expect(answer.status).toBe('provisional');
    expect(answer.profile.unconfirmed.map(({ path }) => path)).toEqual([
      'strengths.table-3.1.S460.upTo40.fy',
    ]);
  });

  test('a recalled psi counts only when it was really read', () => {
    const wind = {
      name: 'wind',
      nature: 'variable',
      category: 'wind',
      kind: 'uniform',
      value: 3,
    } as const;
    const alone = runWaler({ loads: [wind] }, 'uk-na');
    expect(alone.status).toBe('pass');
    const surcharge = { ...wind, name: 'surcharge', category: 'surcharge' } as const;
    const both = runWaler({ loads: [wind, surcharge] }, 'uk-na');
    expect(both.status).toBe('provisional');
    expect(both.profile.unconfirmed.map(({ path }) => path)).toEqual(['psi.wind.psi_0']);
  });

  test('the thicker flange of a UK section takes the lower strength of the product standard', () => {
    const heavy = {
      section: 'UB 610x229x125',
      material: { type: 'steel', grade: 'S275' },
    } as const;
    expect(runWaler(heavy, 'uk-na').values.f_y?.value).toBe(265);
    expect(runWaler(heavy, 'en-recommended').values.f_y?.value).toBe(275);
  });
});

describe('load sets', () => {
  test('the worst of all sets governs and is named', () => {
    const answer = runWaler({
      loadSets: [
        { id: 'C1', situation: 'persistent', combination: 'A1', loads: northFace.loads ?? [] },
        { id: 'C2', situation: 'persistent', combination: 'none', loads: uniform(240) },
      ],
    });
    const combination = verification(answer, 'bending-y').combination;
    const line = answer.combinations?.find(({ id }) => id === combination);
    expect(line?.loadSet).toBe('C2');
  });

  test('design values are never factored again', () => {
    const refusal = refusalOf({
      loadBasis: 'design',
      loadSets: [
        { id: 'C1', situation: 'persistent', combination: 'A1', loads: northFace.loads ?? [] },
      ],
    });
    expect(refusal.code).toBe('factored-twice');
  });
});

describe('what lies outside this version is refused with its clause', () => {
  test.each<[string, Partial<WalerRequest>, string]>([
    [
      'thrust',
      { thrust: [{ name: 'earth', nature: 'permanent', value: 280 }] },
      'EN 1993-1-1 6.2.9 and 6.3.3',
    ],
    ['loss of a prop', { lossOfProp: true }, 'EN 1990 6.4.3.3'],
    ['timber', { material: { type: 'timber', class: 'C24', serviceClass: 2 } }, 'EN 1995-1-1 6.1'],
    ['a shape by dimensions', { section: { shape: 'round', d: 80 } }, 'EN 1993-1-1 6.2'],
    [
      'a class 4 section',
      { section: 'HE 300 AA', material: { type: 'steel', fy: 460 } },
      'EN 1993-1-5 4.4',
    ],
  ])('%s', (_what, change, clause) => {
    expect(refusalOf(change).items[0]?.clause).toBe(clause);
  });

  test('an unknown section is refused with what is near it', () => {
    expect(refusalOf({ section: 'UB 457x191x68' }).detail).toContain('UB 457x191x67');
  });
});
