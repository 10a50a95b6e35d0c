import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  ViewEncapsulation,
} from '@angular/core';
import type { DiagramPoint } from '../contract';
import { elementWidth } from '../look/element-width';
import { Scrolls } from '../look/scrolls';
import type { DrawingModel } from '../member-drawing/drawing-model';
import { drawingScale, supportPlaces } from '../member-drawing/layout-drawing';
import { fixed, readable } from '../quantity/format';
import { extremesOf, layoutDiagram } from './layout-diagram';

/** An envelope along the member, in line with the drawing above, with its figures as a table. */
@Component({
  selector: 'htc-envelope-diagram',
  templateUrl: './envelope-diagram.html',
  imports: [Scrolls],
  host: { class: 'ht-figure' },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class EnvelopeDiagram {
  /** What is drawn: "Bending moment". */
  readonly name = input.required<string>();
  /** Unit of the values. */
  readonly unit = input.required<string>();
  readonly points = input.required<readonly DiagramPoint[]>();
  /** The member that the diagram stands in line with. */
  readonly member = input.required<DrawingModel>();
  /** Whether positive values are drawn below the axis. */
  readonly down = input(false);
  /** What the diagram covers: "every combination". */
  readonly note = input('');

  protected readonly width = elementWidth();
  protected readonly fixed = fixed;
  protected readonly readable = readable;
  protected readonly extremes = computed(() => extremesOf(this.points()));
  private readonly px = computed(() => this.width() || 700);
  private readonly scale = computed(() => drawingScale(this.member(), this.px()));
  protected readonly layout = computed(() =>
    layoutDiagram(this.points(), this.scale(), this.px(), this.down()),
  );
  protected readonly supports = computed(() =>
    supportPlaces(this.member().spans).map((at) => this.scale().x(at)),
  );
  protected readonly ends = computed(() => [this.scale().left, this.scale().right] as const);
  protected readonly text = computed(() => {
    const parts = this.extremes().map(
      ({ span, max, min }) =>
        `${this.place(span)} from ${readable(min.min)} at ${fixed(min.x, 2)} m to ${readable(max.max)} at ${fixed(max.x, 2)} m`,
    );
    return `${this.name()} in ${this.unit()}: ${parts.join('; ')}.`;
  });

  protected place(span: number): string {
    if (span === 0) return 'start overhang';
    return span > this.member().spans.length ? 'end overhang' : `span ${span}`;
  }
}
