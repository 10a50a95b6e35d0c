import {
  ChangeDetectionStrategy,
  Component,
  linkedSignal,
  untracked,
  ViewEncapsulation,
} from '@angular/core';
import { CheckBase } from '../check/check-base';
import type { CheckKind } from '../check/check-session';
import { CheckSheet } from '../check/check-sheet';
import type { WalerRequest } from '../contract';
import { EnvelopeDiagram } from '../envelope-diagram/envelope-diagram';
import type { WalerDraft } from '../form/draft';
import { readDraft } from '../form/read-draft';
import { shownOfWaler } from '../form/waler-fields';
import { writeDraft } from '../form/write-draft';
import { drawingModel, type DrawingModel } from '../member-drawing/drawing-model';
import { MemberDrawing } from '../member-drawing/member-drawing';
import { ReactionsTable } from '../reactions/reactions-table';
import { WalerForm } from '../waler-form/waler-form';

const walerKind: CheckKind<WalerRequest, WalerDraft> = {
  id: 'waler',
  write: writeDraft,
  read: readDraft,
  shown: shownOfWaler,
};

/** A waler's check: what is asked, its drawing, the answer and the working on one sheet. */
@Component({
  selector: 'htc-waler',
  templateUrl: './waler-check.html',
  imports: [CheckSheet, EnvelopeDiagram, MemberDrawing, ReactionsTable, WalerForm],
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class WalerCheck extends CheckBase<WalerRequest, WalerDraft> {
  protected readonly kind = walerKind;

  /** The member as it is typed; while its spans cannot be read, as it was. */
  protected readonly drawn = linkedSignal<DrawingModel | null, DrawingModel | null>({
    source: () => {
      const { fresh, answer, draft } = this.session;
      const combinations = fresh() ? (answer()?.combinations ?? []) : [];
      return drawingModel(draft(), [...new Set(combinations.flatMap(({ lifted }) => lifted))]);
    },
    computation: (model, before) =>
      model ?? (this.session.draft().spans.trim() === '' ? null : (before?.value ?? null)),
  });
  /** The member of the answer, which the diagrams stand in line with. */
  protected readonly answered = linkedSignal<boolean, DrawingModel | null>({
    source: this.session.fresh,
    computation: (fresh, before) => (fresh ? untracked(this.drawn) : (before?.value ?? null)),
  });
}
