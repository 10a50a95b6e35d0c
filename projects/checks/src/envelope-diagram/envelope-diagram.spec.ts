import { TestBed } from '@angular/core/testing';
import { answerOf } from '../../testing/answers';
import { ElementHarness } from '../../testing/element-harness';
import { drawingModel } from '../member-drawing/drawing-model';
import { writeDraft } from '../form/write-draft';
import { EnvelopeDiagram } from './envelope-diagram';
import { layoutDiagram } from './layout-diagram';
import { scaleOf } from '../member-drawing/scale';

const points = answerOf().diagrams?.moment ?? [];

describe('an envelope', () => {
  const scale = scaleOf(400, 0, 6, 18, 18);

  it('labels its extreme values, each once, and none over another', () => {
    const { labels } = layoutDiagram(points, scale, 400, true);
    expect(labels.map(({ text }) => text)).toEqual(['−118.6', '84.2']);
  });

  it('draws positive moments below the axis and positive shear above', () => {
    const below = layoutDiagram(points, scale, 400, true);
    const above = layoutDiagram(points, scale, 400, false);
    const place = (layout: typeof below) =>
      layout.labels.find(({ text }) => text === '84.2')?.y ?? 0;
    expect(place(below)).toBeGreaterThan(below.zero);
    expect(place(above)).toBeLessThan(above.zero);
  });

  it('keeps every label inside the drawing', () => {
    for (const width of [320, 700]) {
      const narrow = scaleOf(width, 0, 6, 18, 18);
      for (const { x, text } of layoutDiagram(points, narrow, width, true).labels) {
        expect(x - text.length * 3.7).toBeGreaterThanOrEqual(-1);
        expect(x + text.length * 3.7).toBeLessThanOrEqual(width + 1);
      }
    }
  });

  it('is told in words and as a table', () => {
    const fixture = TestBed.createComponent(EnvelopeDiagram);
    const inputs = {
      name: 'Bending moment',
      unit: 'kN m',
      points,
      member: drawingModel(writeDraft({ spans: [3, 3] })),
    };
    for (const [name, input] of Object.entries(inputs)) fixture.componentRef.setInput(name, input);
    fixture.detectChanges();
    const shown = new ElementHarness(fixture.nativeElement as Element);
    expect(shown.images).toEqual([
      'Bending moment in kN m: span 1 from −118.6 at 3.00 m to 84.2 at 1.20 m; span 2 from −118.6 at 3.00 m to 0 at 6.00 m.',
    ]);
    expect(shown.text).toContain('span 1 84.2 1.20 −118.6 3.00');
  });
});
