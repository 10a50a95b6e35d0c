import type { ParamMap } from '@angular/router';
import type { Query } from '../../core/api/api';

/** What narrows the log. An empty text narrows nothing. */
export interface UsageFilters {
  readonly client: string;
  readonly key: string;
  readonly check: string;
  readonly profile: string;
  /** Status of a check, or an HTTP status. */
  readonly answer: string;
  readonly range: Range;
  /** `shown`: with what this console itself asked. */
  readonly console: '' | 'shown';
}

const hour = 3_600_000;
export const ranges = {
  hour: { words: 'last hour', length: hour },
  day: { words: 'last 24 hours', length: 24 * hour },
  week: { words: 'last 7 days', length: 168 * hour },
  month: { words: 'last 30 days', length: 720 * hour },
  all: { words: 'all there is', length: null },
} as const;
export type Range = keyof typeof ranges;

export const checkAnswers = ['pass', 'fail', 'incomplete', 'provisional'] as const;
export const unfiltered: UsageFilters = {
  client: '',
  key: '',
  check: '',
  profile: '',
  answer: '',
  range: 'month',
  console: '',
};

const names = ['client', 'key', 'check', 'profile'] as const;
const isHttpStatus = (text: string): boolean => /^[1-5]\d\d$/.test(text);
const isCheckAnswer = (text: string): boolean => (checkAnswers as readonly string[]).includes(text);
const isRange = (text: string | null): text is Range =>
  text !== null && Object.hasOwn(ranges, text);

/** Reads the address; what it cannot mean is left out. */
export function filtersFrom(params: Pick<ParamMap, 'get'>): UsageFilters {
  const answer = params.get('answer') ?? '';
  const range = params.get('range');
  return {
    ...unfiltered,
    ...Object.fromEntries(names.map((name) => [name, params.get(name) ?? ''])),
    answer: isCheckAnswer(answer) || isHttpStatus(answer) ? answer : '',
    range: isRange(range) ? range : unfiltered.range,
    console: params.get('console') === 'shown' ? 'shown' : '',
  };
}

/** The address of these filters; what stands at its default is left out of it. */
export function addressOf(filters: UsageFilters): Record<string, string | null> {
  const entries = Object.entries(filters) as [keyof UsageFilters, string][];
  return Object.fromEntries(
    entries.map(([name, value]) => [name, value === unfiltered[name] ? null : value]),
  );
}

/** What the service is asked for. */
export function queryOf(filters: UsageFilters, now: Date): Query {
  const { length } = ranges[filters.range];
  const { answer } = filters;
  return {
    client: filters.client,
    key: filters.key,
    check: filters.check,
    profile: filters.profile,
    answer: isCheckAnswer(answer) ? answer : null,
    status: isHttpStatus(answer) ? answer : null,
    from: length === null ? null : new Date(now.getTime() - length).toISOString(),
  };
}

export const isNarrowed = (filters: UsageFilters): boolean =>
  [...names, 'answer' as const].some((name) => filters[name] !== '');
