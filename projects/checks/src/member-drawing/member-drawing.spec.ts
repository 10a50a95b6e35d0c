import type { WalerRequest } from '../contract';
import { writeDraft } from '../form/write-draft';
import { drawingModel, drawingText } from './drawing-model';
import { layoutDrawing } from './layout-drawing';
import { textWidth } from './scale';

const request = (change: Partial<WalerRequest> = {}): Partial<WalerRequest> => ({
  spans: [3, 3, 2.4],
  overhangs: { start: 0.5 },
  loads: [
    { name: 'earth', nature: 'permanent', kind: 'uniform', value: 95 },
    {
      name: 'ramp',
      nature: 'permanent',
      kind: 'linear',
      start: 12,
      end: 40,
      from: 1,
      to: '4000 mm',
    },
    {
      name: 'crane',
      nature: 'variable',
      category: 'construction',
      kind: 'point',
      value: -40,
      at: 1.5,
    },
    { name: 'bracket', nature: 'permanent', kind: 'moment', value: 25, at: 6 },
  ],
  thrust: [{ name: 'earth', nature: 'permanent', value: 280 }],
  ...change,
});

function model(change: Partial<WalerRequest> = {}, lifted: number[] = []) {
  const made = drawingModel(writeDraft(request(change)), lifted);
  if (!made) throw new Error('nothing is drawn');
  return made;
}

describe('the drawing', () => {
  it('says in words what it shows', () => {
    expect(drawingText(model({}, [2]))).toBe(
      'Waler over 4 props, spans 3, 3, 2.4 m, overhang 0.5 m before prop 1. ' +
        'Loads: earth 95 kN/m all along; ramp 12 to 40 kN/m from 1 to 4 m; crane −40 kN at 1.5 m; ' +
        'bracket 25 kN m at 6 m; earth 280 kN along the member. Lifts off prop 2 in some combinations.',
    );
  });

  it('waits for a span, and draws what can be read of the rest', () => {
    expect(drawingModel(writeDraft(null))).toBeNull();
    const draft = writeDraft(request());
    const rows = draft.rows.map((row) => ({ ...row, value: '1.234' }));
    expect(drawingModel({ ...draft, rows })?.loads).toEqual([]);
  });

  it('draws the first of load sets', () => {
    const loads = request().loads ?? [];
    const sets = {
      loadSets: [{ id: 'A', situation: 'persistent', combination: 'A1', loads }],
    } as const;
    expect(drawingModel(writeDraft({ spans: [3, 3], ...sets }))?.loads[0]?.label).toBe(
      'earth 95 kN/m',
    );
  });

  it.each([320, 390, 700, 1400])(
    'is drawn again for a width of %i px, lengths to scale',
    (width) => {
      const drawn = layoutDrawing(model(), width);
      const [first, second, third, last] = drawn.props.map(({ x }) => x);
      expect(((second ?? 0) - (first ?? 0)) / ((last ?? 0) - (third ?? 0))).toBeCloseTo(3 / 2.4, 1);
      expect(drawn.member.x + drawn.member.width).toBeLessThanOrEqual(width);
      for (const { labelX, label } of drawn.loads) {
        expect(labelX).toBeGreaterThanOrEqual(0);
        expect(labelX + textWidth(label)).toBeLessThanOrEqual(width);
      }
    },
  );

  it('gives loads that overlap lanes of their own', () => {
    const drawn = layoutDrawing(model(), 700);
    const heights = new Set(drawn.loads.map(({ labelY }) => labelY));
    expect(heights.size).toBeGreaterThan(1);
    expect(drawn.loads).toHaveLength(4);
  });

  it('writes together what does not fit between the ticks', () => {
    const spans = Array<number>(20).fill(2.4);
    const drawn = layoutDrawing(model({ spans, overhangs: {} }), 320);
    expect(drawn.dimensions.texts.map(({ text }) => text)).toEqual(['20 × 2.40 = 48 m']);
    expect(drawn.props.filter(({ number }) => number !== '').length).toBeLessThan(21);
  });
});
