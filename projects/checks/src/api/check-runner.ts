import { computed, signal } from '@angular/core';
import {
  catchError,
  defer,
  EMPTY,
  from,
  fromEvent,
  map,
  merge,
  Observable,
  retry,
  Subject,
  switchMap,
  take,
  tap,
  timer,
  type Subscription,
} from 'rxjs';
import type { CheckAnswer } from '../contract';
import { ApiError } from './api-error';

/** Where the check stands. */
export type RunPhase =
  /** Nothing was asked yet. */
  | 'idle'
  /** A request is on its way, or will be in a moment. */
  | 'busy'
  /** The answer shown belongs to the form as it stands. */
  | 'answered'
  /** The service refused the request or the key. */
  | 'refused'
  /** The service is away or asks to wait; the check runs again by itself. */
  | 'offline';

/** What is known of the check that was asked last. */
export interface RunState {
  readonly phase: RunPhase;
  /** The last answer; it belongs to the form only in the phase `answered`. */
  readonly answer: CheckAnswer | null;
  readonly error: ApiError | null;
}

interface Ask {
  readonly request: object;
  readonly wait: number;
  done(answer?: CheckAnswer): void;
}

/** The call behind a check. */
type Call = (request: object, signal: AbortSignal) => Promise<CheckAnswer>;

const DEBOUNCE = 250;
const LONGEST_PAUSE = 30;

/** Runs one check after another: the last request wins, and a service that was away is asked again. */
export class CheckRunner {
  private readonly asks = new Subject<Ask | null>();
  private readonly again = new Subject<void>();
  private readonly running: Subscription;
  private current: Ask | null = null;
  private readonly held = signal<RunState>({ phase: 'idle', answer: null, error: null });

  /** What is known now. */
  readonly state = this.held.asReadonly();
  /** The answer, while it belongs to the form as it stands. */
  readonly fresh = computed(() => (this.held().phase === 'answered' ? this.held().answer : null));

  constructor(private readonly call: Call) {
    this.running = this.asks.pipe(switchMap((ask) => (ask ? this.run(ask) : EMPTY))).subscribe();
  }

  /** Asks a moment later, so that a word being typed is asked once; `now` asks at once. */
  ask(request: object, now = false): Promise<CheckAnswer | undefined> {
    this.current?.done();
    return new Promise((resolve) => {
      const ask: Ask = { request, wait: now ? 0 : DEBOUNCE, done: resolve };
      this.current = ask;
      this.to({ phase: 'busy' });
      this.asks.next(ask);
    });
  }

  /** Asks an absent service at once instead of after the pause. */
  tryNow(): void {
    this.again.next();
  }

  /** Asks no more: the form cannot be read as it stands. The last answer stays, as a stale one. */
  hold(): void {
    this.current?.done();
    this.current = null;
    this.asks.next(null);
    this.to({ phase: 'idle', error: null });
  }

  /** Forgets everything that was asked and answered. */
  clear(): void {
    this.hold();
    this.to({ answer: null });
  }

  /** Ends for good. */
  stop(): void {
    this.current?.done();
    this.running.unsubscribe();
  }

  private run(ask: Ask): Observable<unknown> {
    return timer(ask.wait).pipe(
      switchMap(() =>
        this.once(ask).pipe(
          retry({ delay: (error: unknown, count) => this.pause(error, count, ask) }),
        ),
      ),
      tap((answer) => {
        this.held.set({ phase: 'answered', answer, error: null });
        ask.done(answer);
      }),
      catchError((error: unknown) => {
        this.to({ phase: 'refused', error: known(error) });
        ask.done();
        return EMPTY;
      }),
    );
  }

  /** One call; leaving it aborts it. */
  private once(ask: Ask): Observable<CheckAnswer> {
    return new Observable((reader) => {
      const abort = new AbortController();
      const asking = defer(() => from(this.call(ask.request, abort.signal)));
      const reading = asking.subscribe(reader);
      return () => {
        reading.unsubscribe();
        abort.abort();
      };
    });
  }

  /** Waits before the next try, longer each time; ends early when the network is back. */
  private pause(error: unknown, count: number, ask: Ask): Observable<unknown> {
    const fault = known(error);
    if (!fault.retryable) throw fault;
    this.to({ phase: 'offline', error: fault });
    ask.done();
    const seconds = fault.retryAfter ?? Math.min(LONGEST_PAUSE, 2 ** (count - 1));
    const early = merge(fromEvent(globalThis, 'online'), this.again);
    return merge(timer(Math.min(seconds, 60) * 1000), early).pipe(
      take(1),
      map(() => undefined),
    );
  }

  private to(change: Partial<RunState>): void {
    this.held.update((state) => ({ ...state, ...change }));
  }
}

function known(error: unknown): ApiError {
  if (error instanceof ApiError) return error;
  const message = 'Something unexpected happened on this page; no answer was read.';
  return new ApiError({ kind: 'unexpected', message });
}
