import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  ViewEncapsulation,
} from '@angular/core';
import type { StressPoint } from '../contract';
import { Scrolls } from '../look/scrolls';
import { fixed } from '../quantity/format';

/** Stress at each named point of a section, or in each state. */
@Component({
  selector: 'htc-points-table',
  templateUrl: './points-table.html',
  imports: [Scrolls],
  host: { class: 'ht-figure' },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class PointsTable {
  readonly points = input.required<readonly StressPoint[]>();
  /** The point that governs. */
  readonly governing = input<string>();

  protected readonly fixed = fixed;
  /** Whether they are states of stress, which stand nowhere on a section. */
  protected readonly states = computed(() => this.points().every(({ y }) => y === null));
}
