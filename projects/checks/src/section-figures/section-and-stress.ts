import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  ViewEncapsulation,
} from '@angular/core';
import type { CheckAnswer } from '../contract';
import { SectionDrawing } from '../section-drawing/section-drawing';
import { answeredSection, type SectionModel } from '../section-drawing/section-model';
import { StressDrawing } from '../stress-drawing/stress-drawing';
import { governingPoint } from './governing-point';

/** The section as it is typed and, beside it, the stress that the answer tells of. */
@Component({
  selector: 'htc-section-and-stress',
  templateUrl: './section-and-stress.html',
  imports: [SectionDrawing, StressDrawing],
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class SectionAndStress {
  readonly model = input.required<SectionModel | null>();
  readonly answer = input<CheckAnswer | null>(null);
  /** Whether the answer belongs to the form before its last change. */
  readonly stale = input(false);

  protected readonly walls = computed(() => this.answer()?.walls ?? []);
  protected readonly advice = computed(
    () => this.answer()?.advisories.map(({ code }) => code) ?? [],
  );
  protected readonly governing = computed(() => {
    const answer = this.answer();
    return answer ? governingPoint(answer) : undefined;
  });
  /** The section of the answer, where there is stress along it. */
  protected readonly stressed = computed(() => {
    const sketch = this.answer()?.section;
    const any = this.walls().some(({ points }) =>
      points.some(({ sigma }) => Math.abs(sigma) > 1e-9),
    );
    const section = sketch && any ? answeredSection(sketch) : null;
    // Beside another section its stress would be read as the stress of that one.
    return section && isAlike(section, this.model()) ? section : null;
  });
}

/** Whether both are drawn alike, but for what an answer adds. */
function isAlike(one: SectionModel, other: SectionModel | null): boolean {
  return one.shape === other?.shape && one.depth === other.depth && one.width === other.width;
}
