import { createHash } from 'node:crypto';
import type { Request } from 'express';
import type { Answer } from './route';

/** Weak comparison, as RFC 9110 has it for `If-None-Match`. */
const holds = (wanted: string | undefined, etag: string): boolean =>
  wanted?.split(',').some((each) => [etag, '*'].includes(each.trim().replace(/^W\//, ''))) ?? false;

/** Strong: over the very bytes that go out. */
export const etagOf = (text: string): string =>
  `"${createHash('sha256').update(text).digest('base64url').slice(0, 22)}"`;

/** The answer, or word that the caller already has it. */
export function revalidated(request: Request, body: unknown): Answer {
  const text = JSON.stringify(body);
  const etag = etagOf(text);
  // Kept by the caller alone, and asked about each time.
  const headers = { ETag: etag, 'Cache-Control': 'private, no-cache' };
  const known = holds(request.get('if-none-match'), etag);
  return known ? { status: 304, body: '', headers } : { status: 200, body: text, headers };
}
