import { computed, inject, Injectable, signal } from '@angular/core';
import { Api, type Query } from '../../core/api/api';
import { type Problem, problemOf } from '../../core/api/problem';
import { type Call, type CallPage, isConsoles } from './call';
import { figuresOf } from './usage-figures';

const pageSize = 200;
/** A page that shows fewer is followed by the next one, as often as this. */
const fewest = 50;
const mostPages = 4;

/** The part of the log that is loaded: the newest page, and the older ones that were asked for. */
@Injectable()
export class UsageLog {
  private readonly api = inject(Api);
  private asked = 0;
  private query: Query = {};

  private readonly loaded = signal<readonly Call[] | null>(null);
  private readonly token = signal<string | null>(null);
  private readonly busyState = signal<'no' | 'fresh' | 'older'>('no');
  private readonly failure = signal<Problem | null>(null);
  private readonly withConsole = signal(false);

  /** Without what the console itself asked, unless that is wanted. */
  readonly calls = computed(() => {
    const calls = this.loaded();
    return this.withConsole() ? calls : (calls?.filter((call) => !isConsoles(call)) ?? null);
  });
  readonly leftOut = computed(() => (this.loaded()?.length ?? 0) - (this.calls()?.length ?? 0));
  readonly busy = this.busyState.asReadonly();
  readonly problem = this.failure.asReadonly();
  readonly hasOlder = computed(() => this.token() !== null);
  readonly figures = computed(() => figuresOf(this.calls() ?? []));

  /** Begins anew; an answer to an earlier question is dropped. */
  async read(query: Query, withConsole: boolean): Promise<void> {
    this.query = query;
    this.withConsole.set(withConsole);
    await this.load('fresh');
  }

  async readOlder(): Promise<void> {
    if (this.busy() === 'no' && this.hasOlder()) await this.load('older');
  }

  private async load(kind: 'fresh' | 'older'): Promise<void> {
    const turn = ++this.asked;
    this.busyState.set(kind);
    this.failure.set(null);
    try {
      let pageToken = kind === 'older' ? this.token() : null;
      let calls = kind === 'older' ? (this.loaded() ?? []) : [];
      const wanted = this.shownOf(calls) + fewest;
      for (let pages = 0; pages < mostPages; pages++) {
        const page = await this.api.get<CallPage>('/v1/usage', {
          ...this.query,
          pageSize,
          pageToken,
        });
        if (turn !== this.asked) return;
        calls = [...calls, ...page.items];
        pageToken = page.nextPageToken;
        if (pageToken === null || this.shownOf(calls) >= wanted) break;
      }
      this.loaded.set(calls);
      this.token.set(pageToken);
    } catch (error) {
      if (turn === this.asked) this.failure.set(problemOf(error));
    } finally {
      if (turn === this.asked) this.busyState.set('no');
    }
  }

  private shownOf(calls: readonly Call[]): number {
    return this.withConsole() ? calls.length : calls.filter((call) => !isConsoles(call)).length;
  }
}
