/** A tool that calls the service. */
export interface Client {
  readonly id: string;
  readonly name: string;
  readonly defaultProfile: string | null;
  readonly createdAt: string;
  readonly disabledAt: string | null;
  readonly liveKeys: number;
}

export type KeyKind = 'secret' | 'page' | 'cell';
export type Scope = 'checks' | 'catalogue' | 'admin';

/** A key as it may be shown: its public part only. */
export interface Key {
  readonly selector: string;
  readonly clientId: string;
  readonly kind: KeyKind;
  readonly label: string;
  readonly scopes: readonly string[];
  readonly origins: readonly string[];
  readonly profiles: readonly string[] | null;
  readonly rateLimit: number | null;
  readonly createdAt: string;
  readonly expiresAt: string | null;
  readonly revokedAt: string | null;
  readonly lastUsedOn: string | null;
  readonly state: 'live' | 'expired' | 'revoked';
}

/** What is asked of a new key. */
export interface KeyRequest {
  readonly kind: 'secret' | 'page';
  readonly label: string;
  readonly scopes: readonly Scope[];
  readonly origins?: readonly string[];
  readonly expiresAt: string | null;
}

/** A new key with its text, which the service tells this once. */
export interface IssuedKey {
  readonly key: Key;
  readonly text: string;
}

const prefixes: Readonly<Record<KeyKind, string>> = { secret: 'htk_', page: 'htp_', cell: 'htc_' };

/** The public part as it stands at the beginning of the key. */
export const shownKey = ({ kind, selector }: Pick<Key, 'kind' | 'selector'>): string =>
  `${prefixes[kind]}${selector}`;

const scopeWords: Readonly<Record<string, string>> = {
  checks: 'make checks',
  catalogue: 'read profiles, sections and formulas',
  usage: 'read the usage log',
};

export const scopesInWords = (scopes: readonly string[]): string =>
  scopes.map((scope) => scopeWords[scope] ?? scope).join('; ');

const day = 86_400_000;

/** Whole days until a live key ends; null for one that does not, or has. */
export function daysLeft({ state, expiresAt }: Pick<Key, 'state' | 'expiresAt'>, now: Date) {
  if (state !== 'live' || expiresAt === null) return null;
  return Math.max(0, Math.ceil((Date.parse(expiresAt) - now.getTime()) / day));
}
