import { TestBed } from '@angular/core/testing';
import { sectionAnswerOf } from '../../testing/section-answers';
import { ElementHarness } from '../../testing/element-harness';
import { InteractionDiagram } from './interaction-diagram';
import { isInside, layoutInteraction } from './layout-interaction';

const curve = sectionAnswerOf().interaction?.[0];
if (!curve) throw new Error('The answer has no curve.');
const acting = (x: number, y: number) => ({ ...curve, point: { x, y } });

describe('an interaction curve', () => {
  it.each([
    [180, 250, true],
    [-180, 250, true],
    [404.5, 370, true],
    [404.6, 100, false],
    [300, 1500, false],
    [0, 2351, true],
    [0, 2352, false],
  ])('holds M = %d, N = %d: %s', (x, y, inside) => expect(isInside(acting(x, y))).toBe(inside));

  it('has its point and its curve between the axes, even where the point is far outside', () => {
    const { left, right, top, bottom, point } = layoutInteraction(acting(4000, 9000), 300);
    expect(point.x).toBeGreaterThan(left);
    expect(point.x).toBeLessThanOrEqual(right);
    expect(point.y).toBeGreaterThanOrEqual(top);
    expect(point.y).toBeLessThan(bottom);
  });

  it('has numbers with the decimals of their step, clear of each other and of the edge', () => {
    const small = {
      ...curve,
      curve: [
        { x: 0, y: 0.09 },
        { x: 0.0125, y: 0 },
      ],
      point: { x: 0, y: 0 },
    };
    for (const one of [small, acting(62_000, 2_000_000)]) {
      const { across, up, right } = layoutInteraction(one, 288);
      const named = across.filter(({ text }) => text !== '');
      for (const [index, { at, text }] of named.entries()) {
        expect(at + (text.length * 7.25) / 2).toBeLessThanOrEqual(288);
        const before = named[index - 1];
        if (before) expect(at - before.at).toBeGreaterThan(text.length * 7.25);
      }
      expect(right).toBeLessThan(288);
      expect(new Set(up.map(({ text }) => text)).size).toBe(up.length);
    }
    const { up } = layoutInteraction(small, 288);
    expect(up.map(({ text }) => text)).toEqual(['0.00', '0.02', '0.04', '0.06', '0.08', '0.10']);
  });

  it('says in words whether what acts is inside, as its verification has it', () => {
    const fixture = TestBed.createComponent(InteractionDiagram);
    fixture.componentRef.setInput('curve', acting(500, 250));
    fixture.detectChanges();
    const shown = new ElementHarness(fixture.nativeElement as Element);
    expect(shown.text).toContain('what acts is outside the curve');
    expect(shown.images[0]).toContain('what acts is outside the curve');
    fixture.componentRef.setInput('verifications', sectionAnswerOf().verifications);
    fixture.detectChanges();
    expect(shown.text).toContain('what acts is inside the curve');
    expect(shown.text).toContain('M y,Ed, kN m');
  });
});
