import { timingSafeEqual } from 'node:crypto';
import type { ChangeFeed } from '../../middleware/change-feed';
import type { ProblemCode } from '../../middleware/problem-codes';
import { isLive, type Key } from './key';
import { parseKey, type ParsedKey } from './key-format';
import type { KeyStore } from './key-store';

/** A key that holds, or why not, with as much of it as may be logged. */
export type Finding =
  | { readonly key: Key }
  | {
      readonly refused: ProblemCode;
      /** Public part of a well-formed key. */
      readonly selector?: string;
      /** Only where the secret was right: the caller owns it. */
      readonly owner?: Key;
    };

const noOrigins: ReadonlySet<string> = new Set();

/**
 * All keys, in memory.
 *
 * How long a revoked key can live: until the NOTIFY of its revocation has arrived and the keys are
 * reloaded, which takes milliseconds. If the listener is cut off, or a reload fails, memory is
 * trusted for two seconds more; from then on each key is looked up in the database, so that it
 * lives no longer than that.
 */
export class KeyCache {
  private bySelector: ReadonlyMap<string, Key> = new Map();
  private origins = noOrigins;
  private originsUntil = Infinity;

  constructor(
    private readonly store: KeyStore,
    private readonly feed: ChangeFeed,
    private readonly now: () => Date = () => new Date(),
  ) {
    feed.subscribe('keys', () => this.reload());
  }

  /** Whether the text is a key that may be used now. A mistyped one is refused without a query. */
  async find(text: string): Promise<Finding> {
    const parsed = parseKey(text);
    if (!parsed) return { refused: 'key-mistyped' };
    const key = this.feed.isTrusted('keys')
      ? this.bySelector.get(parsed.selector)
      : await this.store.find(parsed.selector);
    return this.judge(parsed, key);
  }

  /** Whether any live page key may be used from the origin. */
  allowsOrigin(origin: string): boolean {
    if (this.now().getTime() >= this.originsUntil) this.gatherOrigins();
    return this.origins.has(origin);
  }

  private judge(parsed: ParsedKey, key: Key | undefined): Finding {
    const { selector } = parsed;
    if (key?.kind !== parsed.kind || !timingSafeEqual(key.sha256, parsed.sha256))
      return { refused: 'key-unknown', selector };
    if (key.revokedAt !== null) return { refused: 'key-revoked', selector, owner: key };
    if (!isLive(key, this.now())) return { refused: 'key-expired', selector, owner: key };
    return { key };
  }

  private async reload(): Promise<void> {
    const keys = await this.store.all();
    this.bySelector = new Map(keys.map((key) => [key.selector, key]));
    this.gatherOrigins();
  }

  /** The union over live page keys; gathered anew when the first of them expires. */
  private gatherOrigins(): void {
    const now = this.now();
    const pages = [...this.bySelector.values()].filter(
      (key) => key.kind === 'page' && isLive(key, now),
    );
    this.origins = new Set(pages.flatMap(({ origins }) => origins));
    this.originsUntil = Math.min(
      ...pages.map(({ expiresAt }) => expiresAt?.getTime() ?? Infinity),
      Infinity,
    );
  }
}
