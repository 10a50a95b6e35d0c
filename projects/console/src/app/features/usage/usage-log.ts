import { computed, inject, Injectable, signal } from '@angular/core';
import { Api, type Query } from '../../core/api/api';
import { type Problem, problemOf } from '../../core/api/problem';
import type { Call, CallPage } from './call';
import { figuresOf } from './usage-figures';

const pageSize = 200;

/** The part of the log that is loaded: the newest page, and the older ones that were asked for. */
@Injectable()
export class UsageLog {
  private readonly api = inject(Api);
  private asked = 0;
  private query: Query = {};

  private readonly loadedCalls = signal<readonly Call[] | null>(null);
  private readonly token = signal<string | null>(null);
  private readonly busyState = signal<'no' | 'fresh' | 'older'>('no');
  private readonly failure = signal<Problem | null>(null);

  readonly calls = this.loadedCalls.asReadonly();
  readonly busy = this.busyState.asReadonly();
  readonly problem = this.failure.asReadonly();
  readonly hasOlder = computed(() => this.token() !== null);
  readonly figures = computed(() => figuresOf(this.loadedCalls() ?? []));

  /** Begins anew; an answer to an earlier question is dropped. */
  async read(query: Query): Promise<void> {
    this.query = query;
    await this.load('fresh', null);
  }

  async readOlder(): Promise<void> {
    if (this.busy() === 'no' && this.hasOlder()) await this.load('older', this.token());
  }

  private async load(kind: 'fresh' | 'older', pageToken: string | null): Promise<void> {
    const turn = ++this.asked;
    this.busyState.set(kind);
    this.failure.set(null);
    try {
      const page = await this.api.get<CallPage>('/v1/usage', {
        ...this.query,
        pageSize,
        pageToken,
      });
      if (turn !== this.asked) return;
      const before = kind === 'older' ? (this.loadedCalls() ?? []) : [];
      this.loadedCalls.set([...before, ...page.items]);
      this.token.set(page.nextPageToken);
    } catch (error) {
      if (turn === this.asked) this.failure.set(problemOf(error));
    } finally {
      if (turn === this.asked) this.busyState.set('no');
    }
  }
}
