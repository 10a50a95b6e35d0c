import type {
  CheckAnswer,
  SectionRequest,
  StressRequest,
  WalerRequest,
} from '../../server/engine/checks/contract';
import type { ProblemBody } from '../../server/middleware/problem';

export type Pick<Answer = CheckAnswer> = (answer: Answer) => number;
export type Picks<Answer = CheckAnswer> = Readonly<Record<string, Pick<Answer>>>;

interface Requests {
  readonly waler: WalerRequest;
  readonly section: SectionRequest;
  readonly stress: StressRequest;
}

/** One request of a published example; an example may take several, of several checks. */
interface Asked<Check extends keyof Requests> {
  readonly id: string;
  readonly check: Check;
  readonly request: Requests[Check];
  /** What is given to the service rather than made by it, or is not of the source at all. */
  readonly given?: string;
  /** Values that the source reached through rounded ones, each with the reason. */
  readonly rounded?: Readonly<Record<string, string>>;
  /** Published values that no answer holds, each with its reason. */
  readonly without?: Readonly<Record<string, string>>;
  /** Intermediates that the record states as inputs, and that the service makes by itself. */
  readonly made?: Readonly<Record<string, { readonly half: number; readonly pick: Pick }>>;
}

interface Answered {
  readonly refused?: never;
  /** Where the published values stand in the answer, in the source's units. */
  readonly values: Picks;
}

interface Refused {
  /** Code of the one error that the service answers with, status 422. */
  readonly refused: string;
  readonly values: Picks<Partial<ProblemBody>>;
}

export type CaseOf<Check extends keyof Requests> = Asked<Check> & (Answered | Refused);
export type PublishedCase = { [Check in keyof Requests]: CaseOf<Check> }[keyof Requests];

/** A value of the first verification with that id. */
export const of =
  (id: string, symbol: string, per = 1): Pick =>
  ({ verifications }) =>
    (verifications.find((one) => one.id === id)?.values[symbol]?.value ?? NaN) / per;

/** A value that depends on section, material and profile, or belongs to what governs. */
export const top =
  (symbol: string, per = 1): Pick =>
  ({ values }) =>
    (values[symbol]?.value ?? NaN) / per;

/** The first time that a symbol is worked out. */
export const step =
  (symbol: string): Pick =>
  ({ steps = [] }) =>
    Number(steps.find((one) => one.symbol === symbol)?.value);

export type StressPoint = NonNullable<CheckAnswer['points']>[number];

/** A named point of the section. */
export function pointOf({ points = [] }: CheckAnswer, id: string): StressPoint {
  const found = points.find((one) => one.id === id);
  if (!found) throw new Error(`the answer has no point ${id}`);
  return found;
}

export const point =
  (id: string, field: 'sigma' | 'tau' | 'sigma_v', per = 1): Pick =>
  (answer) =>
    pointOf(answer, id)[field] / per;
