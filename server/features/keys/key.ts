import type { KeyKind } from './key-format';

/** What a key may do. `usage` is an administrator's. */
export const scopes = ['checks', 'catalogue', 'admin'] as const;
export type Scope = (typeof scopes)[number];

/** A key with what its client lends it, as it stands in memory. */
export interface Key {
  readonly id: string;
  readonly clientId: string;
  readonly kind: KeyKind;
  readonly selector: string;
  readonly sha256: Buffer;
  readonly scopes: readonly string[];
  /** Exact origins of a page key. */
  readonly origins: readonly string[];
  /** Slugs it may use; null is all. */
  readonly profiles: readonly string[] | null;
  /** Calls a minute; null is the service's own limit. */
  readonly rateLimit: number | null;
  readonly expiresAt: Date | null;
  /** When it, or its client, was taken out of use. */
  readonly revokedAt: Date | null;
  readonly defaultProfile: string | null;
  /** Slug to the revision that the client is held at. */
  readonly pins: Readonly<Record<string, number>>;
}

export const isLive = (key: Key, now: Date): boolean =>
  key.revokedAt === null && (key.expiresAt === null || key.expiresAt > now);
