import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  viewChild,
  ViewEncapsulation,
} from '@angular/core';
import { AnswerPanel } from '../answer/answer-panel';
import { count } from '../answer/words';
import type { DrawingModel } from '../member-drawing/drawing-model';
import { TitleBlock } from '../title-block/title-block';
import { WorkingSheet } from '../working/working-sheet';
import type { CheckSession, Draft } from './check-session';

/** The caution that stands under every check, with an answer and without. */
const NOTICE =
  'For competent persons. Covers only the verifications listed. Local codes, the firm’s procedures and licensed practice prevail.';

/** The sheet that every check stands on: its head, the answer in the margin, the working, the title block. */
@Component({
  selector: 'htc-check-sheet',
  templateUrl: './check-sheet.html',
  imports: [AnswerPanel, TitleBlock, WorkingSheet],
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class CheckSheet {
  /** What is checked: "Waler". */
  readonly heading = input.required<string>();
  /** Which one, in the words of the drawing. */
  readonly label = input('');
  readonly session = input.required<CheckSession<object, Draft>>();
  readonly readonly = input(false);
  /** The member of the answer, where it has spans. */
  readonly member = input<DrawingModel | null>(null);

  private readonly working = viewChild(WorkingSheet);
  protected readonly count = count;
  protected readonly answer = computed(() => this.session().answer());
  protected readonly fresh = computed(() => this.session().fresh());
  protected readonly notice = computed(() => this.answer()?.notice ?? NOTICE);

  protected choose(event: Event): void {
    this.session().chooseProfile((event.target as HTMLSelectElement).value);
  }

  protected show(id: string): void {
    this.working()?.show(id);
  }
}
