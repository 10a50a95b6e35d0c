import { performance } from 'node:perf_hooks';
import { Client } from 'pg';

export type Topic = 'keys' | 'profiles';

/** Says when something changed, and whether it would know. */
export interface ChangeFeed {
  /** `reload` runs on every change of the topic and after every gap in the listening. */
  subscribe(topic: Topic, reload: () => Promise<void>): void;
  /** Whether what was reloaded last can be taken as how things stand. */
  isTrusted(topic: Topic): boolean;
}

export interface ListenerOptions {
  readonly url: string;
  readonly onGap: (message: string) => void;
  /** Milliseconds without a word from the database after which nothing in memory is trusted. */
  readonly trustFor?: number;
}

interface Subscription {
  readonly reload: () => Promise<void>;
  /** When memory was last known to be as the database is; -Infinity before the first load. */
  confirmed: number;
  /** A change that no finished reload has seen. */
  dirty: boolean;
  running: boolean;
}

const pingEvery = 500;
const channel = 'headtree_changes';

const messageOf = (error: unknown): string => (error instanceof Error ? error.message : 'unknown');

/**
 * Listens to `headtree_changes` on a connection of its own. A connection that breaks, or that
 * answers no ping, is a gap: it is replaced and everything is reloaded, because a NOTIFY sent
 * meanwhile is lost. Trust lasts two seconds past the last answered ping with nothing left to
 * reload.
 */
export class DatabaseChangeFeed implements ChangeFeed {
  private readonly subscriptions = new Map<Topic, Subscription>();
  private readonly trustFor: number;
  private client: Client | undefined;
  private timer: NodeJS.Timeout | undefined;
  private closed = false;
  private away = false;

  constructor(private readonly options: ListenerOptions) {
    this.trustFor = options.trustFor ?? 2_000;
  }

  subscribe(topic: Topic, reload: () => Promise<void>): void {
    this.subscriptions.set(topic, { reload, confirmed: -Infinity, dirty: true, running: false });
  }

  isTrusted(topic: Topic): boolean {
    const confirmed = this.subscriptions.get(topic)?.confirmed ?? -Infinity;
    return performance.now() - confirmed <= this.trustFor;
  }

  /** Connects and loads everything once; goes on trying in the background when it cannot. */
  async start(): Promise<void> {
    await this.beat();
  }

  async close(): Promise<void> {
    this.closed = true;
    clearTimeout(this.timer);
    await this.drop();
  }

  private async beat(): Promise<void> {
    try {
      const asked = performance.now();
      const client = this.client ?? (await this.connect());
      await client.query('SELECT 1');
      await this.reloadDirty();
      for (const subscription of this.subscriptions.values())
        if (!subscription.dirty && !subscription.running) subscription.confirmed = asked;
      this.away = false;
    } catch (error) {
      if (!this.closed && !this.away) this.options.onGap(messageOf(error));
      this.away = true;
      // Not awaited: the end of a connection that hangs may never come.
      void this.drop();
    }
    if (this.closed) return;
    this.timer = setTimeout(() => void this.beat(), pingEvery);
    this.timer.unref();
  }

  private async connect(): Promise<Client> {
    const client = new Client({
      connectionString: this.options.url,
      application_name: 'headtree-listener',
      connectionTimeoutMillis: 1_000,
      query_timeout: 1_000,
    });
    // Without a handler the breaking of an idle connection would end the process.
    client.on('error', () => void this.drop(client));
    client.on('end', () => void this.drop(client));
    client.on('notification', ({ payload }) => this.changed(payload));
    try {
      await client.connect();
      await client.query(`LISTEN ${channel}`);
    } catch (error) {
      client.end().catch(() => undefined);
      throw error;
    }
    this.client = client;
    for (const subscription of this.subscriptions.values()) subscription.dirty = true;
    return client;
  }

  private changed(payload: string | undefined): void {
    for (const [topic, subscription] of this.subscriptions)
      if (payload === topic || payload === undefined || payload === '') subscription.dirty = true;
    // A failure leaves the topic dirty: the next beat tries again.
    this.reloadDirty().catch(() => undefined);
  }

  private async reloadDirty(): Promise<void> {
    await Promise.all([...this.subscriptions.values()].map((each) => this.reload(each)));
  }

  /** A change during a reload is reloaded again: the query may have read before it. */
  private async reload(subscription: Subscription): Promise<void> {
    if (subscription.running) return;
    subscription.running = true;
    try {
      while (subscription.dirty) {
        subscription.dirty = false;
        try {
          await subscription.reload();
        } catch (error) {
          subscription.dirty = true;
          throw error;
        }
      }
    } finally {
      subscription.running = false;
    }
  }

  private async drop(client = this.client): Promise<void> {
    if (!client || client !== this.client) return;
    this.client = undefined;
    await client.end().catch(() => undefined);
  }
}
