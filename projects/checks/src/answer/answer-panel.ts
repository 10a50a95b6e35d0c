import { NgTemplateOutlet } from '@angular/common';
import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  output,
  ViewEncapsulation,
} from '@angular/core';
import type { RunState } from '../api/check-runner';
import type { FieldFault } from '../form/field-reader';
import type { DrawingModel } from '../member-drawing/drawing-model';
import { utilisationText } from '../quantity/format';
import { StatusMark, type MarkKind } from '../status-mark/status-mark';
import { barTone, UtilisationBar } from '../utilisation-bar/utilisation-bar';
import { listed, patternText } from './pattern-words';
import { answerLines, governingText } from './answer-lines';
import {
  capital,
  combinationTerms,
  count,
  provisionalReasons,
  statusWord,
  verificationName,
} from './words';

/** The answer in the margin: its word, what governs, what was verified and what was not. */
@Component({
  selector: 'htc-answer-panel',
  templateUrl: './answer-panel.html',
  imports: [NgTemplateOutlet, StatusMark, UtilisationBar],
  host: { class: 'ht-answer' },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class AnswerPanel {
  /** Where the check stands. */
  readonly state = input.required<RunState>();
  /** What is not given yet, in words. */
  readonly wanting = input<readonly string[]>([]);
  /** How many fields cannot be read or miss what they need. */
  readonly unread = input(0);
  /** What is wrong and no field shows. */
  readonly faults = input<readonly FieldFault[]>([]);
  /** How many things are marked beside their field. */
  readonly beside = input(0);
  /** The member of the answer. */
  readonly member = input<DrawingModel | null>(null);

  /** The verification whose working is asked for. */
  readonly opened = output<string>();
  /** An absent service is to be asked at once. */
  readonly retried = output();

  protected readonly statusWord = statusWord;
  protected readonly utilisationText = utilisationText;
  /** As it stands within a sentence, and at the head of a line. */
  protected readonly nameWithin = verificationName;
  protected readonly verificationName = (id: string) => capital(verificationName(id));
  protected readonly combinationTerms = combinationTerms;
  protected readonly count = count;

  protected readonly answer = computed(() => this.state().answer);
  /** Whether the answer belongs to the form as it stands. */
  protected readonly fresh = computed(() => this.state().phase === 'answered');
  protected readonly kind = computed((): MarkKind => {
    const { phase, answer } = this.state();
    if (phase === 'answered') return answer?.status ?? 'none';
    if (phase === 'busy') return 'busy';
    if (phase === 'offline') return 'away';
    return phase === 'refused' || this.unread() > 0 ? 'refused' : 'none';
  });
  protected readonly word = computed(() => {
    const { phase, answer, error } = this.state();
    if (phase === 'answered' && answer) return statusWord[answer.status];
    if (phase === 'busy') return 'Checking…';
    if (phase === 'offline') return error?.kind === 'too-many' ? 'Waiting' : 'Service away';
    return phase === 'refused' || this.unread() > 0 ? 'Not checked' : 'Not checked yet';
  });
  /** Whether the list beneath says what the message would say. */
  protected readonly repeated = computed(() => {
    const { error } = this.state();
    return this.faults().some(({ message }) => message === error?.message);
  });
  protected readonly failing = computed(
    () => this.answer()?.verifications.filter(({ status }) => status === 'fail') ?? [],
  );
  protected readonly reasons = computed(() => {
    const answer = this.answer();
    return answer?.status === 'provisional' ? provisionalReasons(answer) : [];
  });
  protected readonly lines = computed(() => {
    const answer = this.answer();
    if (!answer) return [];
    const lines = answerLines(answer, this.spans());
    return this.fresh() ? lines : lines.map((line) => ({ ...line, tone: 'none' as const }));
  });
  protected readonly governing = computed(() => {
    const answer = this.answer();
    return answer ? governingText(answer, this.spans()) : null;
  });
  protected readonly tone = computed(() => {
    const answer = this.answer();
    return answer && this.fresh() ? barTone(answer.status, answer.status === 'pass') : 'none';
  });
  /** Where the variable loads of the governing combination stand. */
  protected readonly pattern = computed(() => {
    const combination = this.governing()?.combination;
    const member = this.member();
    if (!combination || !member || combination.lostSupport !== null) return '';
    const { spans, start, end } = member;
    return patternText(combination.pattern, {
      spans: spans.length,
      start: start > 0,
      end: end > 0,
    });
  });
  protected readonly wantingText = computed(() => listed(this.wanting()));
  private readonly spans = computed(() => this.member()?.spans.length ?? 0);
}
