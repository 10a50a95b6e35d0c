import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  ViewEncapsulation,
} from '@angular/core';
import type { CheckAnswer } from '../contract';
import { InteractionDiagram } from '../interaction-diagram/interaction-diagram';
import { PointsTable } from '../points-table/points-table';
import type { SectionModel } from '../section-drawing/section-model';
import { StressDrawing } from '../stress-drawing/stress-drawing';
import { governingPoint } from './governing-point';

/** What an answer about a cross-section shows under its form: shear, interaction, named points. */
@Component({
  selector: 'htc-section-figures',
  templateUrl: './section-figures.html',
  imports: [InteractionDiagram, PointsTable, StressDrawing],
  host: { class: 'ht-figures' },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class SectionFigures {
  readonly answer = input.required<CheckAnswer>();
  /** The section of the answer. */
  readonly model = input<SectionModel | null>(null);

  protected readonly governing = computed(() => governingPoint(this.answer()));
  protected readonly walls = computed(() => this.answer().walls ?? []);
  protected readonly curves = computed(() => this.answer().interaction ?? []);
  /** The section, where there is shear along it that can be drawn. */
  protected readonly shear = computed(() => {
    const sheared = this.walls().some(({ points }) =>
      points.some(({ tau }) => Math.abs(tau) > 1e-9),
    );
    return sheared ? this.model() : null;
  });
  /** The curves that do not stand beside the shear. */
  protected readonly others = computed(() => this.curves().slice(this.shear() ? 1 : 0));
}
