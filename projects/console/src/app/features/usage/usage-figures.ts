import type { Call } from './call';

/** What the loaded calls add up to. Nothing is guessed about calls that are not loaded. */
export interface UsageFigures {
  readonly calls: number;
  readonly refused: number;
  readonly clients: number;
  /** Those who were signed in and asked without a key. */
  readonly people: number;
  /** In microseconds; null without a call. */
  readonly within99: number | null;
  readonly commonest: Refusal | null;
  readonly series: Series;
}

export interface Refusal {
  readonly code: string;
  readonly calls: number;
  readonly clientId: string | null;
  readonly clientName: string | null;
}

export interface Series {
  /** Words for what one point covers. */
  readonly step: string;
  readonly calls: readonly number[];
  readonly refused: readonly (number | null)[];
  readonly within99: readonly (number | null)[];
}

const minute = 60_000;
const steps: readonly { length: number; words: string }[] = [
  { length: minute, words: 'one minute' },
  { length: 5 * minute, words: '5 minutes' },
  { length: 15 * minute, words: '15 minutes' },
  { length: 60 * minute, words: 'one hour' },
  { length: 360 * minute, words: '6 hours' },
  { length: 1440 * minute, words: 'one day' },
  { length: 10_080 * minute, words: 'one week' },
];
const mostPoints = 31;

export const isRefused = ({ httpStatus }: Call): boolean => httpStatus >= 400;

const sum = (calls: readonly Call[]): number =>
  calls.reduce((all, { repeats }) => all + repeats, 0);

/** The time within which 99 of 100 were answered, by nearest rank. */
export function within(calls: readonly Call[], share = 0.99): number | null {
  if (calls.length === 0) return null;
  const times = calls.map(({ durationUs }) => durationUs).sort((a, b) => a - b);
  return times[Math.ceil(share * times.length) - 1] ?? null;
}

const distinct = (ids: readonly (string | null | undefined)[]): number =>
  new Set(ids.filter((id) => typeof id === 'string')).size;

export function figuresOf(calls: readonly Call[]): UsageFigures {
  const refused = calls.filter(isRefused);
  return {
    calls: sum(calls),
    refused: sum(refused),
    clients: distinct(calls.map(({ clientId }) => clientId)),
    people: distinct(calls.map(({ personId }) => personId)),
    within99: within(calls),
    commonest: commonest(refused),
    series: seriesOf(calls),
  };
}

function commonest(refused: readonly Call[]): Refusal | null {
  const totals = new Map<string, Refusal>();
  for (const { code, clientId, clientName = null, repeats } of refused) {
    if (code === null) continue;
    const id = `${code} ${clientId}`;
    totals.set(id, { code, clientId, clientName, calls: (totals.get(id)?.calls ?? 0) + repeats });
  }
  return [...totals.values()].sort((a, b) => b.calls - a.calls)[0] ?? null;
}

function seriesOf(calls: readonly Call[]): Series {
  const times = calls.map(({ at }) => Date.parse(at));
  const first = Math.min(...times);
  const last = Math.max(...times);
  const step = steps.find(({ length }) => (last - first) / length < mostPoints - 1) ?? steps.at(-1);
  if (calls.length === 0 || !step) return { step: '', calls: [], refused: [], within99: [] };
  const points: Call[][] = Array.from(
    { length: Math.floor((last - first) / step.length) + 1 },
    () => [],
  );
  calls.forEach((call, index) => {
    points[Math.floor(((times[index] ?? first) - first) / step.length)]?.push(call);
  });
  return {
    step: step.words,
    calls: points.map(sum),
    refused: points.map((each) =>
      each.length === 0 ? null : sum(each.filter(isRefused)) / sum(each),
    ),
    within99: points.map((each) => within(each)),
  };
}
