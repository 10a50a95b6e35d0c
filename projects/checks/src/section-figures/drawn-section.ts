import { computed, linkedSignal, type Signal } from '@angular/core';
import type { ApiClient } from '../api/api-client';
import type { CheckAnswer, SectionLine } from '../contract';
import { answeredSection, typedSection, type SectionModel } from '../section-drawing/section-model';
import { catalogueLine } from '../section-fields/catalogue-line';
import type { SectionDraft } from '../section-fields/section-draft';
import { choiceOf, isOpen } from '../section-fields/section-shapes';

/** What a session is asked for to draw its section. */
interface Drawable {
  readonly client: Signal<ApiClient>;
  readonly answer: Signal<CheckAnswer | null>;
  readonly fresh: Signal<boolean>;
}

/** The section of a check: as it is typed, and once it is answered with what the answer says of it. */
export class DrawnSection {
  /** What the catalogue holds of the designation. */
  readonly line: Signal<SectionLine | null>;
  readonly answer = computed(() => this.session.answer());
  /** The section of the answer; its figures stand on it. */
  readonly answered = computed((): SectionModel | null => {
    const sketch = this.answer()?.section;
    return sketch ? answeredSection(sketch) : null;
  });
  /** Drawn while it is typed; while it cannot be drawn, as it was. */
  readonly model = linkedSignal<SectionModel | null, SectionModel | null>({
    source: () => (this.session.fresh() ? this.answered() : null) ?? this.typed(),
    computation: (model, before) => model ?? (this.isGiven() ? (before?.value ?? null) : null),
  });
  /** Whether torsion on it has parts; taken so while its shape is not known. */
  readonly isOpen = computed(() => {
    const shape = choiceOf(this.draft().way)?.shape ?? this.line()?.shape ?? this.model()?.shape;
    return isOpen(shape ?? 'I');
  });
  private readonly typed = computed(() => typedSection(this.draft(), this.line()));
  private readonly isGiven = computed(() => {
    const { way, designation, sizes } = this.draft();
    return way === 'designation' ? designation.trim() !== '' : Object.keys(sizes).length > 0;
  });

  /** Made where it is injected. */
  constructor(
    private readonly session: Drawable,
    private readonly draft: () => SectionDraft,
  ) {
    this.line = catalogueLine(session.client, () => {
      const { way, designation } = draft();
      return way === 'designation' ? designation : '';
    });
  }
}
