import type { Credentials } from '../api/api-client';
import type { ProfileSummary } from '../contract';
import type { Option } from '../fields/choice-field';

/**
 * The profiles to choose from: the newest in effect of each, and what is chosen now. A key's client
 * may have a default; a person who is signed in has none and must choose.
 */
export function profileOptions(
  profiles: readonly ProfileSummary[],
  chosen: string,
  credentials: Credentials,
): Option[] {
  const current = profiles.map(({ slug, title }) => ({ value: slug, label: `${slug}, ${title}` }));
  const own = chosen !== '' && !current.some(({ value }) => value === chosen);
  return [
    { value: '', label: credentials === 'key' ? 'the key’s default' : 'choose one' },
    ...current,
    ...(own ? [{ value: chosen, label: chosen }] : []),
  ];
}

/** When a revision was approved; null where the list does not say. */
export function approvedAt(
  profiles: readonly ProfileSummary[],
  { slug, revision }: { slug: string; revision: number },
): string | null {
  const revisions = profiles.find((one) => one.slug === slug)?.revisions ?? [];
  return revisions.find((one) => one.revision === revision)?.approvedAt ?? null;
}
