import { refusalOfSection, runSection, utilisations } from '../../testing/sections';
import type { CheckAnswer, SectionEffects, SectionInput } from '../contract';

const s275 = { type: 'steel', grade: 'S275' } as const;
const s275m = { type: 'steel', grade: 'S275M' } as const;
const s355 = { type: 'steel', fy: 355 } as const;

function check(section: SectionInput, effects: SectionEffects, more = {}): CheckAnswer {
  return runSection({ material: s275, section, effects, ...more }, { detail: 'full' });
}

const valueOf = (answer: CheckAnswer, id: string, symbol: string): number | undefined =>
  answer.verifications.find((one) => one.id === id)?.values[symbol]?.value;

const idsOf = (answer: CheckAnswer): string[] => answer.verifications.map(({ id }) => id);

describe('what is verified follows from what acts', () => {
  test.each([
    [{ tension: 100 }, ['tension']],
    [{ compression: 100 }, ['compression']],
    [{ My: 50 }, ['bending-y']],
    [{ My: 50, Mz: 5 }, ['bending-y', 'bending-z', 'biaxial']],
    [{ My: 50, Vz: 100 }, ['bending-y', 'shear-z']],
    [{ My: 50, Vz: 600 }, ['bending-y', 'shear-z', 'bending-shear-y']],
    [{ My: 50, compression: 100 }, ['compression', 'bending-y', 'bending-axial-y']],
    [{ compression: 100, Vz: 600 }, ['compression', 'shear-z', 'bending-axial-y']],
    [
      { My: 50, Mz: 5, tension: 100 },
      ['tension', 'bending-y', 'bending-z', 'bending-axial-y', 'bending-axial-z', 'biaxial'],
    ],
  ] as const)('%j', (effects, ids) => {
    expect(idsOf(check('UB 457x191x67', effects))).toEqual(ids);
  });

  test('effects of nothing verify nothing, which is no pass', () => {
    expect(check('UB 457x191x67', { My: 0 })).toMatchObject({
      status: 'incomplete',
      utilisation: null,
      verifications: [],
      missing: [{ pointer: '/effects/My', verification: 'bending-y' }],
    });
  });
});

describe('class comes from the compression alone', () => {
  test('a web that bends is class 1 and under more compression class 2, 3 and 4', () => {
    const classes = [0, 400, 800, 2100].map((compression) => {
      const answer = check('UB 457x191x67', { compression, My: 1 });
      return valueOf(answer, 'bending-y', 'section_class');
    });
    expect(classes).toEqual([1, 2, 3, 4]);
  });

  test('tension gives a web no credit', () => {
    const pulled = check('UB 457x191x67', { tension: 1000, My: 10 });
    expect(valueOf(pulled, 'bending-y', 'section_class')).toBe(1);
  });

  const squashed = (compression: number): CheckAnswer =>
    runSection({ material: s355, section: 'IPE 330', effects: { compression } });

  test('an IPE 330 in S355 squashed is class 4: A_eff 6095 mm² (NM-04)', () => {
    const answer = squashed(2150);
    expect(valueOf(answer, 'compression', 'section_class')).toBe(4);
    expect(valueOf(answer, 'compression', 'A_eff')).toBeCloseTo(6095, -0.5);
  });

  test('no compression passes that its plates do not carry', () => {
    expect(squashed(2163).status).toBe('pass');
    expect(squashed(2165).status).toBe('fail');
  });

  test('an area that the caller gave bounds the effective one and is never reduced twice', () => {
    const section = { designation: 'IPE 330', properties: { A: 6095 } };
    const answer = runSection({ material: s355, section, effects: { compression: 2150 } });
    expect(utilisations(answer).compression).toBeCloseTo(2150e3 / (6095 * 355), 6);
  });
});

describe('class 4', () => {
  const thin = { shape: 'channel', h: 200, b: 90, tw: 3, tf: 3 } as const;

  test('a thin channel under compression bends about z-z by the shift of its centroid', () => {
    const answer = runSection({ material: s355, section: thin, effects: { compression: 20 } });
    expect(idsOf(answer)).toEqual(['compression', 'bending-axial-z']);
    expect(valueOf(answer, 'bending-axial-z', 'e_N_z')).toBeGreaterThan(0);
  });

  test.each([
    ['a tube is a shell', { shape: 'CHS', d: 1000, t: 5, forming: 'hot-finished' }, 'EN 1993-1-6'],
    [
      'an angle with slender legs',
      { shape: 'angle', h: 150, b: 150, t: 10, r1: 16, r2: 8 },
      'EN 1993-1-5 4.4',
    ],
  ] as const)('%s, refused with the clause', (_, section, clause) => {
    const refusal = refusalOfSection({ material: s355, section, effects: { compression: 10 } });
    expect([refusal.code, refusal.items[0]?.clause]).toEqual(['class-4', clause]);
  });
});

describe('shear', () => {
  test('a web that buckles in shear takes bending by EN 1993-1-5 7.1', () => {
    const girder = { shape: 'I', h: 1200, b: 300, tw: 8, tf: 25, fabrication: 'welded' } as const;
    const answer = check(girder, { My: 1500, Vz: 600 });
    expect(idsOf(answer)).toContain('web-buckling-shear');
    const found = answer.verifications.find(({ id }) => id === 'bending-shear-y');
    expect(found?.clause).toBe('EN 1993-1-5 7.1(1) (7.1)');
  });

  test('shear along the flanges takes from bending about y-y, which they carry', () => {
    const answer = check('HE 300 B', { My: 300, Vy: 1700 });
    expect(valueOf(answer, 'bending-shear-y', 'M_V_y_Rd')).toBeLessThan(200);
  });

  test('both shears of a tube are one force', () => {
    const answer = check('CHS 219.1x10', { Vz: 300, Vy: 400 });
    expect(answer.verifications.map(({ id, effect }) => [id, effect.value])).toEqual([
      ['shear-z', 500],
    ]);
  });
});

describe('torsion', () => {
  test.each([
    ['T without its parts', { T: 1 }, '/effects/stVenant'],
    ['a warping part without the rest', { warping: 1 }, '/effects/stVenant'],
    ['no bimoment', { T: 1, stVenant: 0.4, warping: 0.6 }, '/effects/bimoment'],
  ] as const)('an open section is refused with %s', (_, effects, pointer) => {
    const refusal = refusalOfSection({ material: s275, section: 'UB 457x191x67', effects });
    expect([refusal.items[0]?.pointer, refusal.items[0]?.clause]).toEqual([
      pointer,
      'EN 1993-1-1 6.2.7(2)',
    ]);
  });

  test('parts that do not add up are for the caller to mend', () => {
    const effects = { T: 2, stVenant: 0.4, warping: 0.6, bimoment: 0 };
    const refusal = refusalOfSection({ material: s275, section: 'UB 457x191x67', effects });
    expect(refusal.items).toMatchObject([{ code: 'contradiction', pointer: '/effects/T' }]);
  });

  test('walls that buckle in shear carry less torsion, and shear beside it', () => {
    const thin = 'CF RHS 400x200x4.5';
    const twist = (effects: SectionEffects): Record<string, number> =>
      utilisations(runSection({ material: { type: 'steel', fy: 355 }, section: thin, effects }));
    expect(twist({ T: 112 }).torsion).toBeCloseTo(1.21, 2);
    const both = twist({ T: 60, Vz: 200 });
    expect(both['web-buckling-shear']).toBeGreaterThan(1);
  });

  test('warping shears the web of a channel more than its flanges', () => {
    const section = { shape: 'channel', h: 400, b: 100, tw: 5, tf: 20 } as const;
    const effects = { stVenant: 0, warping: 100, bimoment: 0 };
    const answer = runSection({ material: s355, section, effects });
    expect(valueOf(answer, 'torsion', 'tau_w_Ed')).toBeGreaterThan(315);
    expect(answer.status).toBe('fail');
  });

  test('flanges of class 4 carry less bimoment', () => {
    const section = { shape: 'I', h: 600, b: 600, tw: 10, tf: 8, fabrication: 'welded' } as const;
    const effects = { stVenant: 0, warping: 0, bimoment: 99 };
    expect(utilisations(runSection({ material: s355, section, effects })).biaxial).toBeGreaterThan(
      1.5,
    );
  });

  test.each([
    { shape: 'I', h: 200, b: 20, tw: 15, tf: 60, r: 2 },
    { shape: 'channel', h: 200, b: 20, tw: 15, tf: 60, r: 2 },
  ] as const)('a stubby $shape has the torsion constant of its plates, never less', (section) => {
    const effects = { stVenant: 1, warping: 0, bimoment: 0 };
    const answer = runSection({ material: s275, section, effects });
    expect(answer.values.I_t?.value).toBeGreaterThan(3e5);
  });

  test('a hollow section carries T as it is, and shear has what it leaves', () => {
    const answer = check('SHS 150x150x8', { T: 20, Vz: 200 });
    expect(idsOf(answer)).toEqual(['shear-z', 'torsion', 'shear-torsion']);
    const left = valueOf(answer, 'shear-torsion', 'V_pl_T_z_Rd') ?? 0;
    expect(left).toBeLessThan(valueOf(answer, 'shear-z', 'V_pl_z_Rd') ?? 0);
  });

  test('torsion that fills the walls of a box takes from bending, shear or no shear', () => {
    const twisted = check('SHS 150x150x8', { T: 44, My: 50 });
    expect(valueOf(twisted, 'torsion', 'utilisation')).toBeLessThan(1);
    const bent = utilisations(twisted);
    expect(bent['bending-shear-y']).toBeGreaterThan(2 * (bent['bending-y'] ?? NaN));
    expect(idsOf(check('SHS 150x150x8', { T: 20, My: 50 }))).toEqual(['bending-y', 'torsion']);
  });

  test('a bimoment stands in one elastic sum with bending', () => {
    const effects = { My: 100, stVenant: 0.2, warping: 0.8, bimoment: 2 };
    const answer = check('UB 457x191x67', effects);
    const sum = answer.verifications.find(({ id }) => id === 'biaxial');
    expect(sum?.clause).toBe('EN 1993-1-1 6.2.7(5) and 6.2.1(7)');
    const B_Rd = sum?.values.B_Rd?.value ?? NaN;
    const M_y_Rd = sum?.values.M_c_y_Rd?.value ?? NaN;
    expect(sum?.utilisation).toBeCloseTo(100 / M_y_Rd + 2 / B_Rd, 9);
  });
});

test('von Mises of a class 4 section is asked for and cannot be had: incomplete', () => {
  const thin = { shape: 'RHS', h: 300, b: 200, t: 3, forming: 'hot-finished' } as const;
  const answer = check(thin, { compression: 10 }, { vonMises: true });
  expect([answer.status, answer.missing[0]?.verification]).toEqual(['incomplete', 'von-mises']);
});

describe('a net area', () => {
  test('counts in tension with f_u, and its strengths are from memory: provisional', () => {
    const answer = check('UB 457x191x67', { tension: 500 }, { netArea: 7000 });
    expect(answer.status).toBe('provisional');
    expect(valueOf(answer, 'tension', 'N_u_Rd')).toBeCloseTo((0.9 * 7000 * 430) / 1.25 / 1e3, 6);
  });

  test.each([
    ['without f_u', { tension: 500 }, s355, '/material/fu'],
    ['of a quality whose f_u is not held', { tension: 500 }, s275m, '/material/grade'],
    ['beside bending', { tension: 500, My: 10 }, s275, '/netArea'],
  ] as const)('leaves the answer incomplete %s', (_, effects, material, pointer) => {
    const section = 'UB 457x191x67';
    const answer = runSection({ material, section, effects, netArea: 7000 });
    expect([answer.status, answer.missing[0]?.pointer]).toEqual(['incomplete', pointer]);
  });

  test('is no greater than the area', () => {
    const request = { material: s275, section: 'IPE 200', effects: { tension: 1 }, netArea: 9000 };
    expect(refusalOfSection(request).items[0]?.pointer).toBe('/netArea');
  });
});

test('an angle that bends is classed by its outstands, one that is compressed by both its legs', () => {
  const section = 'L 100x100x10';
  const bent = runSection({ material: s355, section, effects: { My: 1 } });
  expect(valueOf(bent, 'bending-y', 'section_class')).toBe(3);
  expect(refusalOfSection({ material: s355, section, effects: { compression: 1 } }).code).toBe(
    'class-4',
  );
});

test('an unequal angle is never turned: the other name is offered', () => {
  const request = { material: s275, section: 'L 90x150x12', effects: { My: 1 } };
  expect(refusalOfSection(request).items[0]?.message).toContain('L 150x90x12');
});

describe('sections that cannot be are refused at the dimension', () => {
  test.each([
    [
      'walls thicker than half',
      { shape: 'RHS', h: 100, b: 60, t: 30, forming: 'hot-finished' },
      't',
    ],
    ['corners without room', { shape: 'SHS', h: 40, t: 14, forming: 'cold-formed' }, 't'],
    ['a wall through the middle', { shape: 'CHS', d: 60, t: 30, forming: 'hot-finished' }, 't'],
    ['flanges without a web', { shape: 'I', h: 50, b: 100, tw: 5, tf: 25 }, 'tf'],
    ['a web as wide as the flange', { shape: 'I', h: 200, b: 20, tw: 20, tf: 10 }, 'tw'],
    ['roots too large', { shape: 'I', h: 200, b: 100, tw: 6, tf: 10, r: 95 }, 'r'],
    ['roots wider than the flange', { shape: 'I', h: 400, b: 60, tw: 6, tf: 10, r: 40 }, 'r'],
    ['a channel without a web', { shape: 'channel', h: 60, b: 40, tw: 6, tf: 30 }, 'tf'],
    ['a leg as thick as it is long', { shape: 'angle', h: 50, b: 50, t: 50 }, 't'],
    ['a toe rounder than its leg', { shape: 'angle', h: 90, b: 90, t: 6, r1: 9, r2: 7 }, 'r2'],
  ] as const)('%s', (_, section, dimension) => {
    const refusal = refusalOfSection({ material: s275, section, effects: { My: 1 } });
    expect([refusal.code, refusal.items[0]?.pointer]).toEqual([
      'impossible-section',
      `/section/${dimension}`,
    ]);
  });

  test('a size of timber is not taken as steel', () => {
    const request = { material: s275, section: 'timber 47x150', effects: { My: 1 } };
    expect(refusalOfSection(request).code).toBe('contradiction');
  });
});

describe('what goes beside the answer', () => {
  test('a hollow section whose forming was not said is taken as hot-finished, with a caution', () => {
    const codes = (section: string): string[] =>
      check(section, { My: 1 }).advisories.map(({ code }) => code);
    expect(codes('SHS 150x150x8')).toContain('forming-assumed');
    expect(codes('CF SHS 150x150x8')).not.toContain('forming-assumed');
    expect(codes('hot-finished SHS 150x150x8')).not.toContain('forming-assumed');
  });

  test('a curve of what is carried together holds the point that passes', () => {
    const { interaction = [] } = check('UB 457x191x67', { compression: 400, My: 150, Mz: 5 });
    expect(interaction.map(({ verification }) => verification)).toEqual([
      'bending-axial-y',
      'bending-axial-z',
      'biaxial',
    ]);
    for (const { curve } of interaction) {
      expect(curve.every(({ x, y }) => x >= 0 && y >= 0)).toBe(true);
    }
  });

  test('where the point lies on the curve the utilisation is 1', () => {
    const { interaction = [] } = check('HE 300 B', { compression: 1500, My: 100, Mz: 50 });
    const biaxial = interaction.find(({ verification }) => verification === 'biaxial');
    const { x: My = 0, y: Mz = 0 } = biaxial?.curve[20] ?? {};
    const answer = check('HE 300 B', { compression: 1500, My, Mz });
    expect(utilisations(answer).biaxial).toBeCloseTo(1, 6);
  });

  test('the strips that class 4 leaves out stand in the sketch', () => {
    const answer = runSection(
      { material: s355, section: 'IPE 330', effects: { compression: 2150 } },
      { detail: 'full' },
    );
    expect(answer.section?.ineffective).toEqual([
      { under: 'N', y: 0, z: 0, width: 7.5, height: expect.closeTo(22, 0) as number },
    ]);
  });
});
