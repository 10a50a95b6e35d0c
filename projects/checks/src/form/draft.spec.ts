import type { WalerRequest } from '../contract';
import { emptyRow, type WalerDraft } from './draft';
import { placeFaults } from './place-faults';
import { readDraft } from './read-draft';
import { shownOfWaler } from './waler-fields';
import { writeDraft } from './write-draft';

const northFace: WalerRequest = {
  material: { type: 'steel', grade: 'S275' },
  section: 'UB 457x191x67',
  loadBasis: 'characteristic',
  spans: [3, 3, 2.4],
  loads: [
    { name: 'earth', nature: 'permanent', kind: 'uniform', value: 95 },
    { name: 'surcharge', nature: 'variable', category: 'surcharge', kind: 'uniform', value: 22 },
  ],
};

const everything: WalerRequest = {
  profile: 'uk-na@2',
  material: { type: 'steel', fy: 275, fu: '430 MPa', E: 205000 },
  section: {
    designation: 'UC 254x254x89',
    count: 2,
    connected: true,
    share: 0.6,
    properties: { Iy: 1 },
  },
  loadBasis: 'design',
  spans: ['12 ft', 1.234, '2400 mm'],
  overhangs: { start: 0.5, end: '1 ft' },
  loads: [
    {
      name: 'a',
      nature: 'permanent',
      kind: 'linear',
      start: '80 kN/m',
      end: -110.5,
      from: -0.5,
      to: 2,
    },
    {
      name: 'b',
      nature: 'variable',
      category: 'construction',
      kind: 'point',
      value: 4,
      at: 1.8,
      duration: 'short-term',
      patternLoading: false,
    },
    { name: 'c', nature: 'accidental', kind: 'moment', value: '3 kN m', at: 0 },
    { name: 'd', nature: 'permanent', kind: 'area', value: 6.2, width: 1.2 },
  ],
  patternLoading: false,
  thrust: [{ name: 'a', nature: 'permanent', value: 280, duration: 'long-term' }],
  supports: 'both-ways',
  supportStiffness: [null, '120 kN/mm', 80, null],
  selfWeight: false,
  verticalSupports: { spacing: 2 },
  restraint: { loadedFace: { spacing: 1.2 }, propFace: 'at-supports' },
  loadLevel: 'bottom',
  bearing: { length: 0.2, endDistance: 0 },
  lossOfProp: [1, 3],
  deflectionLimit: { instant: 'span/200', final: 'span/150' },
  bucklingFactors: { y: 0.9 },
  interaction: 'annex-A',
  lateralTorsional: 'rolled',
  waive: [{ verification: 'deflection', reason: 'Movement is monitored.' }],
};

const sets: WalerRequest = {
  ...northFace,
  loadSets: [
    { id: 'DA1-C1', situation: 'persistent', combination: 'A1', loads: northFace.loads ?? [] },
  ],
};
delete (sets as { loads?: unknown }).loads;

const edit = (request: WalerRequest, change: Partial<WalerDraft>) =>
  readDraft({ ...writeDraft(request), ...change });

describe('a request that goes through the form untouched', () => {
  it.each([
    ['a plain one', northFace],
    ['one with every field', everything],
    ['one with load sets', sets],
    [
      'a section by its dimensions',
      { ...northFace, section: { shape: 'I', h: 453.4, b: 189.9, tw: 8.5, tf: 12.7 } },
    ],
    ['a timber', { ...northFace, material: { type: 'timber', class: 'C24', serviceClass: 2 } }],
  ] as [string, WalerRequest][])('comes out as it went in: %s', (_, request) => {
    expect(readDraft(writeDraft(request)).request).toEqual(request);
  });
});

describe('a field that is changed', () => {
  it('changes nothing else', () => {
    const { request } = edit(everything, { spans: '3,0 m + 8 ft' });
    expect(request).toEqual({
      ...everything,
      spans: [3, '8 ft'],
      supportStiffness: everything.supportStiffness,
    });
  });

  it('keeps what a load holds beyond the table', () => {
    const draft = writeDraft(everything);
    const rows = draft.rows.map((row, index) => (index === 1 ? { ...row, value: '5,5' } : row));
    expect(readDraft({ ...draft, rows }).request?.loads?.[1]).toEqual({
      ...everything.loads?.[1],
      value: 5.5,
    });
  });

  it('drops the overrides of a section that is no longer meant', () => {
    expect(edit(everything, { section: 'UB 457x191x67' }).request?.section).toEqual({
      designation: 'UB 457x191x67',
      count: 2,
      connected: true,
    });
    expect(edit(northFace, { count: '2' }).request?.section).toEqual({
      designation: 'UB 457x191x67',
      count: 2,
    });
  });

  it('takes a deflection limit in any spelling and keeps the others', () => {
    expect(edit(everything, { deflectionLimit: 'L/250' }).request?.deflectionLimit).toEqual({
      instant: 'span/250',
      final: 'span/150',
    });
    expect(edit(northFace, { deflectionLimit: '200' }).request?.deflectionLimit).toBe('span/200');
    expect(edit(northFace, { deflectionLimit: '12 mm' }).faults).toMatchObject([
      { pointer: '/deflectionLimit' },
    ]);
  });
});

describe('a form that is no request yet', () => {
  it('names what it wants', () => {
    expect(readDraft(writeDraft(null)).wanting).toEqual([
      'a section',
      'a steel grade',
      'spans',
      'a load',
    ]);
  });

  it('points at the field that cannot be read', () => {
    const row = { ...emptyRow(), name: 'crane', nature: 'variable' as const, value: 'x' };
    const draft = writeDraft(northFace);
    const { faults, request } = readDraft({ ...draft, rows: [...draft.rows, emptyRow(), row] });
    expect(request).toBeNull();
    expect(faults.map(({ pointer }) => pointer)).toEqual(['/loads/2/category', '/loads/2/value']);
  });
});

describe('what the service refuses', () => {
  const at = (pointer: string, request = northFace) => {
    const { beside, rest } = placeFaults(shownOfWaler(writeDraft(request)), [
      { pointer, message: 'no', code: 'x' },
    ]);
    return rest.length > 0 ? 'the list' : [...beside.keys()][0];
  };

  it.each([
    ['/spans/1', '/spans'],
    ['/section/designation', '/section'],
    ['/material', '/material/grade'],
    ['/material/grade', '/material/grade'],
    ['/loads/1/value', '/loads/1/value'],
    ['/loads/1/kind', '/loads/1'],
    ['/loads/7/value', '/loads'],
    ['/bearing', '/bearing/length'],
    ['/restraint/loadedFace/spacing', '/restraint'],
    ['/thrust/0/value', 'the list'],
    ['/bucklingFactors/y', 'the list'],
    ['', 'the list'],
  ])('stands beside the nearest field: %s', (pointer, place) => expect(at(pointer)).toBe(place));

  it('stands in the row of its thrust', () => {
    expect(at('/thrust/0/value', everything)).toBe('/thrust/0/value');
  });
});
