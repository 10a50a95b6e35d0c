import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  ViewEncapsulation,
} from '@angular/core';
import { elementWidth } from '../look/element-width';
import { layoutSection } from './layout-section';
import { ineffectiveText, sectionText, type SectionModel } from './section-model';

/** A section to scale with its axes and dimensions, drawn again for each width. */
@Component({
  selector: 'htc-section-drawing',
  templateUrl: './section-drawing.html',
  host: { class: 'ht-figure' },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class SectionDrawing {
  /** What is drawn; without it the place of the drawing says what it waits for. */
  readonly model = input.required<SectionModel | null>();

  private readonly width = elementWidth();
  protected readonly heading = computed(() => this.model()?.name ?? 'Section');
  protected readonly note = computed(() => (this.model() ? 'to scale, mm' : ''));
  protected readonly text = computed(() => {
    const model = this.model();
    return model ? sectionText(model) : '';
  });
  protected readonly lost = computed(() => ineffectiveText(this.model()?.ineffective ?? []));
  protected readonly layout = computed(() => {
    const model = this.model();
    return model ? layoutSection(model, this.width() || 340) : null;
  });
}
