import type { KeyRequest, Scope } from './client';
import { originsIn } from './origins';

const day = 86_400_000;

/** How long a key may live; the words are those of the field. */
export const expiries = {
  month: { words: 'after 30 days', days: 30 },
  quarter: { words: 'after 90 days', days: 90 },
  year: { words: 'after one year', days: 365 },
  never: { words: 'not, until it is revoked', days: null },
} as const;

/** The log is read from servers only, never from a page. */
export const usageIsFor = (kind: 'secret' | 'page'): boolean => kind === 'secret';

export interface IssueForm {
  readonly kind: 'secret' | 'page';
  readonly label: string;
  readonly origins: string;
  readonly checks: boolean;
  readonly catalogue: boolean;
  readonly usage: boolean;
  readonly expiry: keyof typeof expiries;
}

export function requestFrom(form: IssueForm, now: Date): KeyRequest {
  const { days } = expiries[form.expiry];
  const wanted: readonly [Scope, boolean][] = [
    ['checks', form.checks],
    ['catalogue', form.catalogue],
    ['admin', form.usage && usageIsFor(form.kind)],
  ];
  return {
    kind: form.kind,
    label: form.label.trim(),
    scopes: wanted.filter(([, chosen]) => chosen).map(([scope]) => scope),
    ...(form.kind === 'page' && { origins: originsIn(form.origins) }),
    expiresAt: days === null ? null : new Date(now.getTime() + days * day).toISOString(),
  };
}
