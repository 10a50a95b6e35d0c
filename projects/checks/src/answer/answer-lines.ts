import { barTone, type BarTone } from '../utilisation-bar/utilisation-bar';
import type { CheckAnswer, Verification } from '../contract';
import { utilisationText } from '../quantity/format';
import { capital, placeText, pointText, verificationName } from './words';

/** A verification that was made, as the answer lists it. */
export interface AnswerLine {
  readonly id: string;
  readonly title: string;
  readonly clause: string;
  readonly place: string;
  readonly number: string;
  readonly utilisation: number | null;
  readonly holds: boolean;
  readonly tone: BarTone;
  readonly reason: string;
}

/** The verifications that were made, the most used first. */
export function answerLines(answer: CheckAnswer, spans: number): AnswerLine[] {
  return answer.verifications
    .map((one) => {
      const holds = one.status === 'pass';
      return {
        id: one.id,
        title: one.title,
        clause: one.clause,
        place: whereText(one, answer, spans),
        number: utilisationText(one.utilisation),
        utilisation: one.utilisation,
        holds,
        tone: barTone(answer.status, holds),
        reason: one.reason ?? '',
      };
    })
    .sort((a, b) => (b.utilisation ?? Infinity) - (a.utilisation ?? Infinity));
}

/** What governs: its words, its place and its combination. */
export function governingText(answer: CheckAnswer, spans: number) {
  const alike = answer.verifications.filter(({ id }) => id === answer.governing);
  const found = alike.find(({ utilisation }) => utilisation === answer.utilisation) ?? alike[0];
  if (!found) return null;
  const combination = answer.combinations?.find(({ id }) => id === found.combination) ?? null;
  return {
    title: `${found.title || capital(verificationName(found.id))} governs`,
    where: whereText(found, answer, spans) + (found.combination ? ', combination ' : ''),
    combinationId: found.combination,
    combination,
  };
}

/** Along the member, or on the one cross-section that there is. */
function whereText(one: Verification, answer: CheckAnswer, spans: number): string {
  return ['section', 'stress'].includes(answer.check)
    ? pointText(one, answer)
    : placeText(one.at, spans);
}
