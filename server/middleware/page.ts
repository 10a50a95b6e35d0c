import { Problem } from './problem';

export const defaultPageSize = 100;
export const maxPageSize = 500;

const version = '1';

/** Opaque to callers: where the next page begins. */
export const tokenAfter = (mark: string): string =>
  Buffer.from(`${version}:${mark}`).toString('base64url');

/** @throws {Problem} when the token is none of this list's, or the size is out of range. */
export function readPage(
  query: Readonly<Record<string, string | undefined>>,
  isMark: (mark: string) => boolean,
): { size: number; after: string | undefined } {
  const errors = [];
  const { pageSize, pageToken } = query;
  const size = pageSize === undefined ? defaultPageSize : Number(pageSize);
  if (!/^\d{1,3}$/.test(pageSize ?? '1') || size < 1 || size > maxPageSize)
    errors.push({
      pointer: '/query/pageSize',
      code: 'value',
      message: `Must be 1 to ${maxPageSize}.`,
    });
  const text = Buffer.from(pageToken ?? '', 'base64url').toString('utf8');
  const after = pageToken === undefined ? undefined : text.slice(version.length + 1);
  if (after !== undefined && (tokenAfter(after) !== pageToken || !isMark(after)))
    errors.push({
      pointer: '/query/pageToken',
      code: 'value',
      message: 'Not a token of this list.',
    });
  if (errors.length > 0)
    throw new Problem('query-not-valid', 'The query is not valid.', { errors });
  return { size, after };
}

/** One page of rows of which one more than the size was read. */
export function pageOf<Row>(
  rows: readonly Row[],
  size: number,
  markOf: (row: Row) => string,
): { items: readonly Row[]; nextPageToken: string | null } {
  const items = rows.slice(0, size);
  const last = items.at(-1);
  const more = rows.length > size && last !== undefined;
  return { items, nextPageToken: more ? tokenAfter(markOf(last)) : null };
}
