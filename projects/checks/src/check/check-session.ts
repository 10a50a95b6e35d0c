import {
  computed,
  DestroyRef,
  effect,
  inject,
  linkedSignal,
  signal,
  untracked,
  type Signal,
} from '@angular/core';
import {
  ApiClient,
  HEADTREE_CSRF_TOKEN,
  HEADTREE_FETCH,
  type Credentials,
} from '../api/api-client';
import type { ApiError } from '../api/api-error';
import { CheckRunner, type RunState } from '../api/check-runner';
import type { CheckAnswer, CheckId, ProfileSummary } from '../contract';
import type { DraftReading } from '../form/field-reader';
import { placeFaults, type ShownFields } from '../form/place-faults';
import { approvedAt, profileOptions } from './profile-options';

/** What every form holds, whatever else is typed into it. */
export interface Draft {
  readonly profile: string;
}

/** What tells one check from another: its address and how its form is written and read. */
export interface CheckKind<Request extends object, Typed extends Draft> {
  readonly id: CheckId;
  /** A request as the form shows it; an empty form where there is none. */
  write(request: Request | null, profile: string): Typed;
  /** The form as a request, or why it is none yet. */
  read(draft: Typed): DraftReading<Request>;
  /** What the form shows, for faults to find their place. */
  shown(draft: Typed): ShownFields;
}

/** What a check is given, and whom it tells. */
export interface CheckInputs<Request extends object> {
  readonly value: Signal<Request | null>;
  readonly apiKey: Signal<string>;
  readonly server: Signal<string>;
  readonly profile: Signal<string>;
  readonly credentials: Signal<Credentials>;
  onChange(request: Request): void;
  /** The fields hold nothing that can be sent, where they did. */
  onUnread(): void;
  onAnswer(answer: CheckAnswer): void;
  onFailed(error: ApiError): void;
}

const SECTION = 'a section';

/** A check as it is filled in: what is typed, what was asked last and what came of it. */
export class CheckSession<Request extends object, Typed extends Draft> {
  private readonly fetcher = inject(HEADTREE_FETCH);
  private readonly csrfToken = inject(HEADTREE_CSRF_TOKEN);
  /** The request that was last given out, so that its return changes nothing that is typed. */
  private given: Request | null = null;
  /** Whether it is known outside that the fields hold nothing that can be sent. */
  private unread = true;

  readonly client = computed(() => {
    const { server, apiKey, credentials } = this.inputs;
    const { csrfToken } = this;
    const access = { server: server(), apiKey: apiKey(), credentials: credentials(), csrfToken };
    return new ApiClient(access, this.fetcher);
  });
  private readonly runner = new CheckRunner((request, signal) =>
    this.client().check(this.kind().id, request, signal),
  );
  /** Whether something is being typed that does not count yet. */
  private readonly pending = signal(false);
  /** Where the check stands. */
  readonly state = computed((): RunState => this.runner.state());
  /** How often the form was filled from outside: what is half typed then goes. */
  readonly round = computed(() => {
    this.draft();
    return this.writes;
  });
  private writes = 0;
  private readonly profiles = signal<readonly ProfileSummary[]>([]);

  /** The form as it is typed. */
  readonly draft = linkedSignal<[Request | null, string], Typed>({
    source: () => [this.inputs.value(), this.inputs.profile()],
    computation: ([value, profile], before) =>
      before && value && same(value, this.given) && profile === before.source[1]
        ? before.value
        : this.write(value, profile),
  });
  /** The form as a request; none while something is being typed or a person chose no factors. */
  readonly reading = computed((): DraftReading<Request> => {
    const reading = this.kind().read(this.draft());
    const wanting = [...reading.wanting];
    const { profile } = this.draft();
    if (profile === '' && this.inputs.credentials() !== 'key') wanting.push('a factor profile');
    if (this.pending() && !wanting.includes(SECTION)) wanting.unshift(SECTION);
    return wanting.length > 0 ? { ...reading, request: null, wanting } : reading;
  });
  /** What is wrong, beside its field or apart. */
  readonly placed = computed(() => {
    const { faults } = this.reading();
    const all = [...faults, ...(this.state().error?.items ?? [])];
    return placeFaults(this.kind().shown(this.draft()), all);
  });
  readonly profileOptions = computed(() =>
    profileOptions(this.profiles(), this.draft().profile, this.inputs.credentials()),
  );
  readonly profileFault = computed(() => this.placed().beside.get('/profile'));

  /** The last answer, while something like it can still be shown. */
  readonly answer = computed(() => this.state().answer);
  /** Whether the answer belongs to the form as it stands. */
  readonly fresh = computed(() => this.state().phase === 'answered');
  readonly approvedAt = computed(() => {
    const answer = this.answer();
    return answer ? approvedAt(this.profiles(), answer.profile) : null;
  });

  constructor(
    private readonly kind: () => CheckKind<Request, Typed>,
    private readonly inputs: CheckInputs<Request>,
  ) {
    inject(DestroyRef).onDestroy(() => this.runner.stop());
    effect(() => {
      const client = this.client();
      if (!client.obstacle) untracked(() => void this.loadProfiles(client));
    });
    effect(() => {
      this.client();
      const { request } = this.reading();
      untracked(() => this.follow(request));
    });
    effect(() => {
      const { phase, answer, error } = this.runner.state();
      untracked(() => {
        if (phase === 'answered' && answer) inputs.onAnswer(answer);
        else if (error && phase !== 'busy') inputs.onFailed(error);
      });
    });
  }

  /** Checks at once; undefined where there is nothing that can be sent, or no answer. */
  async check(): Promise<CheckAnswer | undefined> {
    const { request } = this.reading();
    return request ? this.runner.ask(request, true) : undefined;
  }

  /** Puts the form back to the value that was last set from outside. */
  reset(): void {
    this.runner.clear();
    this.draft.set(this.write(this.inputs.value(), this.inputs.profile()));
  }

  /** Takes what was typed and tells of it. */
  change(draft: Typed): void {
    this.draft.set(draft);
    this.tell();
  }

  /** Takes whether a designation is being typed that does not count yet. */
  wait(pending: boolean): void {
    if (pending === untracked(this.pending)) return;
    this.pending.set(pending);
    this.tell();
  }

  /** Takes a change of some fields. */
  set(change: Partial<Typed>): void {
    this.change({ ...this.draft(), ...change });
  }

  chooseProfile(profile: string): void {
    this.change({ ...this.draft(), profile });
  }

  /** Asks an absent service at once. */
  retry(): void {
    this.runner.tryNow();
  }

  /** Fills the form from outside. */
  private write(value: Request | null, profile: string): Typed {
    this.writes += 1;
    this.given = null;
    this.unread = value === null;
    return this.kind().write(value, profile);
  }

  /** Gives the request out where it is a new one, and tells once when there is none any more. */
  private tell(): void {
    const { request } = untracked(this.reading);
    if (!request) {
      if (!this.unread) this.inputs.onUnread();
      this.unread = true;
    } else if (this.unread || !same(request, this.given)) {
      this.unread = false;
      this.given = request;
      this.inputs.onChange(request);
    }
  }

  private follow(request: Request | null): void {
    if (request) void this.runner.ask(request);
    else this.runner.hold();
  }

  private async loadProfiles(client: ApiClient): Promise<void> {
    try {
      this.profiles.set(await client.profiles());
    } catch {
      this.profiles.set([]);
    }
  }
}

function same(a: unknown, b: unknown): boolean {
  return JSON.stringify(a) === JSON.stringify(b);
}
