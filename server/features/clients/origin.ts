import type { RefusalItem } from '../../engine/refusal';

/** Scheme, host and port as a browser writes them; the port only where it is not the usual one. */
function exactOrigin(text: string): string | undefined {
  if (!URL.canParse(text)) return undefined;
  const { protocol, origin, hostname } = new URL(text);
  if (protocol !== 'https:' && protocol !== 'http:') return undefined;
  return hostname === '' || hostname.includes('*') ? undefined : origin;
}

/** What is wrong with an origin of a page key; it is compared character by character. */
export function originFault(text: string, pointer: string): RefusalItem | undefined {
  const exact = exactOrigin(text);
  if (exact === text) return undefined;
  const item = { pointer, code: 'not-an-origin' };
  if (exact === undefined)
    return {
      ...item,
      message: 'Must be one origin: scheme, host and, where it is not the usual one, port.',
      fix: 'For example "https://intranet.example" or "http://tools.example:8080".',
    };
  return {
    ...item,
    message: 'An origin is written as the browser sends it, without path, capitals or usual port.',
    fix: `Did you mean "${exact}"?`,
  };
}
