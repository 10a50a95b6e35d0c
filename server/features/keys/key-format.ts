import { createHash, randomBytes, randomInt } from 'node:crypto';
import { crc32 } from 'node:zlib';

export const keyKinds = ['secret', 'page', 'cell'] as const;
export type KeyKind = (typeof keyKinds)[number];

/** A key taken apart: what may be stored and compared, never the secret itself. */
export interface ParsedKey {
  readonly kind: KeyKind;
  /** Public part: finds the key, stands in lists and logs. */
  readonly selector: string;
  /** Over the whole text. The secret is 256 random bits, so one SHA-256 is the right hash. */
  readonly sha256: Buffer;
}

export interface MintedKey extends ParsedKey {
  /** Shown once, stored nowhere. */
  readonly text: string;
}

/**
 * Published, so that scanners of repositories can find a key that leaked. The last six characters
 * are a checksum: a scanner that computes it raises no false alarm.
 */
export const keyPattern = /^ht([kpc])_([0-9A-Za-z]{12})_([0-9A-Za-z]{43})([0-9A-Za-z]{6})$/;

const digits = '0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz';
const letters: Readonly<Record<KeyKind, string>> = { secret: 'k', page: 'p', cell: 'c' };
const kinds: ReadonlyMap<string, KeyKind> = new Map(
  keyKinds.map((kind) => [letters[kind], kind] as const),
);

function base62(value: bigint, length: number): string {
  let text = '';
  for (let rest = value; rest > 0n; rest /= 62n) text = digits.charAt(Number(rest % 62n)) + text;
  return text.padStart(length, '0');
}

const checksum = (body: string): string => base62(BigInt(crc32(body)), 6);

const sha256 = (text: string): Buffer => createHash('sha256').update(text, 'latin1').digest();

/** A new key: the 256 bits are written as one number in base 62, so that no digit is favoured. */
export function mintKey(kind: KeyKind): MintedKey {
  const selector = Array.from({ length: 12 }, () => digits.charAt(randomInt(62))).join('');
  const secret = base62(BigInt(`0x${randomBytes(32).toString('hex')}`), 43);
  const body = `ht${letters[kind]}_${selector}_${secret}`;
  const text = body + checksum(body);
  return { kind, selector, sha256: sha256(text), text };
}

/** What a caller sent as a key; undefined when it is mistyped, which needs no look-up to say. */
export function parseKey(text: string): ParsedKey | undefined {
  const match = keyPattern.exec(text);
  if (!match) return undefined;
  const [, letter = '', selector = ''] = match;
  const kind = kinds.get(letter);
  if (kind === undefined || checksum(text.slice(0, -6)) !== text.slice(-6)) return undefined;
  return { kind, selector, sha256: sha256(text) };
}
