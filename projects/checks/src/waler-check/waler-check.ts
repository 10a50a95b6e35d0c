import {
  booleanAttribute,
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  effect,
  inject,
  input,
  linkedSignal,
  output,
  signal,
  untracked,
  viewChild,
  ViewEncapsulation,
} from '@angular/core';
import { AnswerPanel } from '../answer/answer-panel';
import { count } from '../answer/words';
import {
  ApiClient,
  HEADTREE_CSRF_TOKEN,
  HEADTREE_FETCH,
  type Credentials,
} from '../api/api-client';
import type { ApiError } from '../api/api-error';
import { CheckRunner, type RunState } from '../api/check-runner';
import type { CheckAnswer, ProfileSummary, WalerRequest } from '../contract';
import { EnvelopeDiagram } from '../envelope-diagram/envelope-diagram';
import type { WalerDraft } from '../form/draft';
import { placeFaults } from '../form/place-faults';
import { readDraft } from '../form/read-draft';
import { writeDraft } from '../form/write-draft';
import { drawingModel, type DrawingModel } from '../member-drawing/drawing-model';
import { MemberDrawing } from '../member-drawing/member-drawing';
import { ReactionsTable } from '../reactions/reactions-table';
import { TitleBlock } from '../title-block/title-block';
import { WalerForm } from '../waler-form/waler-form';
import { WorkingSheet } from '../working/working-sheet';
import { approvedAt, profileOptions } from './profile-options';

/** The caution that stands under every check, with an answer and without. */
const NOTICE =
  'For competent persons. Covers only the verifications listed. Local codes, the firm’s procedures and licensed practice prevail.';

/** A waler's check: what is asked, its drawing, the answer and the working on one sheet. */
@Component({
  selector: 'htc-waler',
  templateUrl: './waler-check.html',
  imports: [
    AnswerPanel,
    EnvelopeDiagram,
    MemberDrawing,
    ReactionsTable,
    TitleBlock,
    WalerForm,
    WorkingSheet,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class WalerCheck {
  /** The request as JSON, numbers with a decimal point; null for an empty form. */
  readonly value = input<WalerRequest | null>(null);
  /** A page key (`htp_…`). A secret key is refused before anything is sent. */
  readonly apiKey = input('');
  /** Base address of the service; '' for the page's own origin. */
  readonly server = input('');
  /** The factor profile where the request names none, such as `uk-na` or `uk-na@2`. */
  readonly profile = input('');
  /** What is checked, in the words of the drawing: "north face, level 2". */
  readonly label = input('');
  /** Whether calls carry the page key or the console's own session. */
  readonly credentials = input<Credentials>('key');
  /** Whether the fields can only be read. */
  readonly readonly = input(false, { transform: booleanAttribute });

  /** The request after each change that can be read. */
  readonly valueChange = output<WalerRequest>();
  /** Each new answer. */
  readonly result = output<CheckAnswer>();
  /** Why there is no answer. */
  readonly failed = output<ApiError>();

  private readonly fetcher = inject(HEADTREE_FETCH);
  private readonly csrfToken = inject(HEADTREE_CSRF_TOKEN);
  private readonly working = viewChild(WorkingSheet);
  /** The request that was last given out, so that its return changes nothing that is typed. */
  private given: WalerRequest | null = null;

  protected readonly client = computed(() => {
    const access = {
      server: this.server(),
      apiKey: this.apiKey(),
      credentials: this.credentials(),
      csrfToken: this.csrfToken,
    };
    return new ApiClient(access, this.fetcher);
  });
  private readonly runner = new CheckRunner(() => this.client());
  /** Whether a section is being typed that does not count yet. */
  protected readonly picking = signal(false);
  /** Where the check stands; what is typed beyond it makes its answer an old one. */
  protected readonly state = computed((): RunState => {
    const state = this.runner.state();
    return this.picking() && state.phase === 'answered' ? { ...state, phase: 'busy' } : state;
  });
  protected readonly profiles = signal<readonly ProfileSummary[]>([]);

  protected readonly draft = linkedSignal<[WalerRequest | null, string], WalerDraft>({
    source: () => [this.value(), this.profile()],
    computation: ([value, profile], before) =>
      before && same(value, this.given) && profile === before.source[1]
        ? before.value
        : writeDraft(value, profile),
  });
  protected readonly reading = computed(() => readDraft(this.draft()));
  protected readonly placed = computed(() => {
    const { faults } = this.reading();
    return placeFaults(this.draft(), [...faults, ...(this.state().error?.items ?? [])]);
  });
  protected readonly profileOptions = computed(() =>
    profileOptions(this.profiles(), this.draft().profile),
  );
  protected readonly profileFault = computed(() => this.placed().beside.get('/profile'));

  /** The last answer, while something like it can still be shown. */
  protected readonly answer = computed(() => this.state().answer);
  protected readonly fresh = computed(() => this.state().phase === 'answered');
  /** The member as it is typed; while its spans cannot be read, as it was. */
  protected readonly drawn = linkedSignal<DrawingModel | null, DrawingModel | null>({
    source: () => {
      const combinations = this.fresh() ? (this.answer()?.combinations ?? []) : [];
      return drawingModel(this.draft(), [...new Set(combinations.flatMap(({ lifted }) => lifted))]);
    },
    computation: (model, before) =>
      model ?? (this.draft().spans.trim() === '' ? null : (before?.value ?? null)),
  });
  /** The member of the answer, which the diagrams stand in line with. */
  protected readonly answered = linkedSignal<boolean, DrawingModel | null>({
    source: this.fresh,
    computation: (fresh, before) => (fresh ? untracked(this.drawn) : (before?.value ?? null)),
  });
  protected readonly approvedAt = computed(() => {
    const answer = this.answer();
    return answer ? approvedAt(this.profiles(), answer.profile) : null;
  });
  protected readonly notice = computed(() => this.answer()?.notice ?? NOTICE);
  protected readonly count = count;

  constructor() {
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
        if (phase === 'answered' && answer) this.result.emit(answer);
        else if (error && phase !== 'busy') this.failed.emit(error);
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
    this.given = null;
    this.runner.clear();
    this.draft.set(writeDraft(this.value(), this.profile()));
  }

  protected choose(event: Event): void {
    const profile = (event.target as HTMLSelectElement).value;
    this.draft.update((draft) => ({ ...draft, profile }));
  }

  protected change(draft: WalerDraft): void {
    this.draft.set(draft);
    const { request } = this.reading();
    if (request && !same(request, this.given)) {
      this.given = request;
      this.valueChange.emit(request);
    }
  }

  protected retry(): void {
    this.runner.tryNow();
  }

  protected show(id: string): void {
    this.working()?.show(id);
  }

  private follow(request: WalerRequest | null): void {
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
