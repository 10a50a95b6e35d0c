import { modelOf, sectionAnswerOf } from '../../testing/section-answers';
import { layoutStress } from './layout-stress';
import { stressText } from './stress-labels';

const { section, walls = [], points = [] } = sectionAnswerOf();
const model = modelOf(section);

describe('stress along the walls', () => {
  it('is filled where it is tension and lined where it is compression', () => {
    const { filled, edged, lines } = layoutStress(model, walls, points, 'sigma', 340, undefined);
    // The web from its middle down and the bottom flange; the top flange and the rest of the web.
    expect(filled.match(/M/g)).toHaveLength(2);
    expect(edged.match(/M/g)).toHaveLength(2);
    expect(lines.match(/M/g)?.length).toBeGreaterThan(20);
  });

  it('ends compression where the stress is exactly nothing at a station: My alone', () => {
    const bent = [-160, 0, 160].map((sigma) => ({ y: 0, z: (sigma * 214) / 160, sigma, tau: 0 }));
    for (const points of [bent, bent.map((one) => ({ ...one, sigma: one.sigma || 1e-14 }))]) {
      const web = [{ id: 'web', title: 'web', t: 8.5, points }];
      const drawn = layoutStress(model, web, [], 'sigma', 340, undefined);
      const zs = (path: string) => Array.from(path.matchAll(/ ([\d.]+)/g), ([, z]) => Number(z));
      expect(drawn.filled.match(/M/g)).toHaveLength(1);
      expect(drawn.edged.match(/M/g)).toHaveLength(1);
      expect(Math.min(...zs(drawn.filled))).toBe(Math.max(...zs(drawn.edged)));
      expect(Math.max(...zs(drawn.lines))).toBeLessThanOrEqual(Math.min(...zs(drawn.filled)));
    }
  });

  it('runs round a tube without a seam', () => {
    const at = (turn: number) => ({ y: 50 * Math.sin(turn), z: -50 * Math.cos(turn) });
    const turns = Array.from({ length: 17 }, (_, index) => (index * Math.PI) / 8);
    const ring = (sigma: (z: number) => number) => [
      {
        id: 'wall',
        title: 'wall',
        t: 5,
        points: turns.map((turn) => ({ ...at(turn), sigma: sigma(at(turn).z), tau: 0 })),
      },
    ];
    const pulled = layoutStress(
      model,
      ring(() => 90),
      [],
      'sigma',
      340,
      undefined,
    );
    expect(pulled.filled.match(/M/g)).toHaveLength(2);
    const bent = layoutStress(
      model,
      ring((z) => z),
      [],
      'sigma',
      340,
      undefined,
    );
    expect([bent.filled, bent.edged].map((path) => path.match(/M/g)?.length)).toEqual([1, 1]);
  });

  it('is filled alone where it is shear', () => {
    const { edged, filled } = layoutStress(model, walls, points, 'tau', 340, undefined);
    expect(edged).toBe('');
    expect(filled.match(/M/g)).toHaveLength(3);
  });

  it('says its sign, and of shear its size', () => {
    expect([95.7, -168.2, 0].map((value) => stressText(value, 'sigma'))).toEqual([
      '+95.7',
      '−168',
      '0.0',
    ]);
    expect(stressText(-70.4, 'tau')).toBe('70.4');
  });

  it('rings the point that governs', () => {
    const { dots } = layoutStress(model, walls, points, 'sigma', 340, 'junction-top');
    expect(dots.map(({ governs }) => governs).indexOf(true)).toBe(3);
  });

  it.each([288, 340])('keeps its values inside %d px and apart', (width) => {
    const { labels } = layoutStress(model, walls, points, 'sigma', width, undefined);
    expect(labels.length).toBeGreaterThan(3);
    for (const [index, one] of labels.entries()) {
      expect(one.x).toBeGreaterThanOrEqual(0);
      expect(one.x + one.text.length * 7.25).toBeLessThanOrEqual(width + 1);
      for (const other of labels.slice(index + 1))
        expect(Math.abs(one.y - other.y) >= 14 || Math.abs(one.x - other.x) > 20).toBe(true);
    }
  });

  it('names the greatest of either sign, however near they stand', () => {
    const close = points.map((point, index) => ({
      ...point,
      y: 95,
      z: -226 + index,
      sigma: index === 0 ? 120 : index === 1 ? -140 : 0,
    }));
    const { labels } = layoutStress(model, walls, close, 'sigma', 340, undefined);
    expect(labels.map(({ text }) => text)).toEqual(['−140', '+120']);
    expect(labels[1]?.line).toMatch(/^M/);
  });

  it('runs along the legs of an angle to its heel, and names the heel', () => {
    const angle = modelOf({
      name: 'L 100x100x10',
      shape: 'angle',
      dimensions: { h: 100, b: 100, t: 10, r1: 12, r2: 6 },
      ineffective: [],
    });
    const { left, bottom } = angle.bounds;
    const leg = [bottom - 100, bottom - 50, bottom - 5].map((z) => ({
      y: left + 5,
      z,
      sigma: z,
      tau: 0,
    }));
    const heel = { id: 'heel', title: 'Heel', y: left, z: bottom, sigma: 60, tau: 0, sigma_v: 60 };
    const upright = [{ id: 'leg-vertical', title: 'Upright leg', t: 10, points: leg }];
    const drawn = layoutStress(angle, upright, [heel], 'sigma', 340, undefined);
    const zs = (path: string) =>
      Math.max(...Array.from(path.matchAll(/ ([\d.]+)/g), ([, z]) => Number(z)));
    expect(zs(drawn.filled)).toBeCloseTo(zs(drawn.outline), 0);
    expect(drawn.labels.map(({ text }) => text)).toEqual(['+60.0']);
  });

  it('stands off a solid: over its depth beside it, over its width beneath', () => {
    const flat = modelOf({
      name: 'FL 100x40',
      shape: 'rectangle',
      dimensions: { h: 40, b: 100 },
      ineffective: [],
    });
    const parts = [-1, 0, 1];
    const lines = [
      {
        id: 'depth',
        title: 'Over the depth',
        t: 100,
        points: parts.map((at) => ({ y: 0, z: at * 20, sigma: at * 50, tau: 15 * (1 - at ** 2) })),
      },
      {
        id: 'width',
        title: 'Over the width',
        t: 40,
        points: parts.map((at) => ({ y: at * 50, z: 0, sigma: 0, tau: 15 })),
      },
    ];
    const shear = layoutStress(flat, lines, [], 'tau', 340, undefined);
    expect(shear.titles.map(({ text }) => text)).toEqual(['τ at y = 0', 'τ at z = 0']);
    const numbers = (path: string) => Array.from(path.matchAll(/[\d.]+/g), ([one]) => Number(one));
    const drawn = numbers(shear.outline);
    const [right, low] = [0, 1].map((odd) =>
      Math.max(...drawn.filter((_, index) => index % 2 === odd)),
    );
    const [beside, beneath] = shear.filled.split('Z').map(numbers);
    expect(Math.min(...(beside ?? []).filter((_, index) => index % 2 === 0))).toBeGreaterThan(
      right ?? 0,
    );
    expect(Math.min(...(beneath ?? []).filter((_, index) => index % 2 === 1))).toBeGreaterThan(
      low ?? 0,
    );
    const bent = layoutStress(flat, lines, [], 'sigma', 340, undefined);
    expect(bent.titles.map(({ text }) => text)).toEqual(['σ at y = 0']);
    expect(bent.labels.map(({ text }) => text).sort()).toEqual(['+50.0', '−50.0']);
  });
});
