import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  ViewEncapsulation,
} from '@angular/core';
import type { StressPoint, StressWall } from '../contract';
import { elementWidth } from '../look/element-width';
import type { SectionModel } from '../section-drawing/section-model';
import { layoutStress } from './layout-stress';
import type { StressName } from './stations';
import { stressText } from './stress-labels';

/** What the drawing says of an advisory of the answer. */
const ADVICE: Readonly<Record<string, string>> = {
  'stress-of-gross-section': 'Of the gross section.',
  'bimoment-adds': 'The bimoment is taken to add at every tip.',
};

/** How stress runs along the walls of a section, drawn outwards from each. */
@Component({
  selector: 'htc-stress-drawing',
  templateUrl: './stress-drawing.html',
  host: { class: 'ht-figure' },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class StressDrawing {
  readonly model = input.required<SectionModel>();
  readonly walls = input.required<readonly StressWall[]>();
  readonly points = input.required<readonly StressPoint[]>();
  /** Which stress is drawn. */
  readonly of = input<StressName>('sigma');
  /** Codes of what the answer advises of. */
  readonly advice = input<readonly string[]>([]);
  /** The point that governs, which gets a ring. */
  readonly governing = input<string>();

  private readonly width = elementWidth();
  protected readonly layout = computed(() => {
    const width = this.width() || 340;
    const [walls, points] = [this.walls(), this.points()];
    return layoutStress(this.model(), walls, points, this.of(), width, this.governing());
  });
  protected readonly text = computed(() => {
    const of = this.of();
    const name = of === 'sigma' ? 'Stress along the member' : 'Shear stress';
    const said = this.walls().map(({ title, points }) => {
      const values = points.map((point) => (of === 'tau' ? Math.abs(point.tau) : point.sigma));
      const [least, most] = [Math.min(...values), Math.max(...values)].map((value) =>
        stressText(value, of),
      );
      return `${title} ${least === most ? (most ?? '') : `${least ?? ''} to ${most ?? ''}`}`;
    });
    return `${name} in N/mm²: ${said.join('; ')}.`;
  });
  protected readonly legend = computed(() => {
    const ring = this.governing() ? ' Ringed: the point that governs.' : '';
    const advised = Object.entries(ADVICE)
      .filter(([code]) => this.advice().includes(code))
      .map(([, text]) => ` ${text}`)
      .join('');
    if (this.of() === 'tau') return `Shaded: size of the shear stress.${ring}`;
    return `Filled: tension, +. Lined: compression, −.${ring}${advised}`;
  });
}
