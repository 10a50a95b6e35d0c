import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  ViewEncapsulation,
} from '@angular/core';
import { elementWidth } from '../look/element-width';
import { drawingText, type DrawingModel } from './drawing-model';
import { layoutDrawing } from './layout-drawing';

/** The member to scale with its props and loads, drawn again for each width. */
@Component({
  selector: 'htc-member-drawing',
  templateUrl: './member-drawing.html',
  host: { class: 'ht-drawing' },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class MemberDrawing {
  /** What is drawn; without it the place of the drawing says what it waits for. */
  readonly model = input.required<DrawingModel | null>();

  private readonly width = elementWidth();
  protected readonly text = computed(() => {
    const model = this.model();
    return model ? drawingText(model) : '';
  });
  protected readonly layout = computed(() => {
    const model = this.model();
    return model ? layoutDrawing(model, this.width() || 700) : null;
  });
}
