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
