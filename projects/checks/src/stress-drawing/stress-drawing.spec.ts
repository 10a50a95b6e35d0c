import { modelOf, sectionAnswerOf } from '../../testing/section-answers';
import { layoutStress, stressText } from './layout-stress';

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
});
