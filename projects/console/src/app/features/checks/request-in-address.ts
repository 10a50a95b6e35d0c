/** A request as the part of an address behind the #: it is never sent to a server. */
export function toFragment(request: object): string {
  const bytes = new TextEncoder().encode(JSON.stringify(request));
  const binary = Array.from(bytes, (byte) => String.fromCharCode(byte)).join('');
  return `r=${btoa(binary).replaceAll('+', '-').replaceAll('/', '_').replace(/=+$/, '')}`;
}

/** The request that an address carries; null where it carries none that can be read. */
export function fromFragment(fragment: string | null): object | null {
  const text = /^r=([\w-]+)$/.exec(fragment ?? '')?.[1];
  if (text === undefined) return null;
  try {
    const binary = atob(text.replaceAll('-', '+').replaceAll('_', '/'));
    const bytes = Uint8Array.from(binary, (character) => character.charCodeAt(0));
    const request: unknown = JSON.parse(new TextDecoder().decode(bytes));
    const isRequest = typeof request === 'object' && request !== null && !Array.isArray(request);
    return isRequest ? request : null;
  } catch {
    return null;
  }
}
