import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  ElementRef,
  inject,
  input,
  linkedSignal,
  signal,
  untracked,
  ViewEncapsulation,
} from '@angular/core';
import type { ApiClient } from '../api/api-client';
import { capital, count, verificationName } from '../answer/words';
import type { CheckAnswer, Formula, Step } from '../contract';
import { utilisationText } from '../quantity/format';
import { WorkingLine } from './working-line';

/** The lines of one verification. */
export interface WorkingGroup {
  readonly id: string;
  readonly title: string;
  readonly number: string;
  readonly steps: readonly Step[];
}

/** Section and material first, then each verification with its lines. */
export function workingGroups(answer: CheckAnswer): WorkingGroup[] {
  const groups = new Map<string, Step[]>();
  for (const step of answer.steps ?? []) {
    const id = step.verification ?? 'common';
    const known = groups.get(id);
    if (known) known.push(step);
    else groups.set(id, [step]);
  }
  return [...groups].map(([id, steps]) => {
    const made = answer.verifications.find((one) => one.id === id);
    const title = id === 'common' ? 'Section and material' : capital(verificationName(id));
    const number = made ? utilisationText(made.utilisation) : '';
    return { id, title: made?.title ?? title, number, steps };
  });
}

/** The whole working: formulas, numbers and clauses, verification by verification. */
@Component({
  selector: 'htc-working-sheet',
  templateUrl: './working-sheet.html',
  imports: [WorkingLine],
  host: { class: 'ht-working', '(window:beforeprint)': 'loadAll()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class WorkingSheet {
  readonly answer = input.required<CheckAnswer>();
  /** Where the formulas are asked for. */
  readonly client = input.required<ApiClient>();

  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  protected readonly count = count;
  protected readonly groups = computed(() => workingGroups(this.answer()));
  protected readonly open = linkedSignal<string | null, ReadonlySet<string>>({
    source: () => this.answer().governing,
    computation: (governing, before) => new Set([...(before?.value ?? []), governing ?? '']),
  });
  protected readonly formulas = signal<ReadonlyMap<string, Formula>>(new Map());

  constructor() {
    effect(() => {
      const open = this.open();
      const steps = this.groups()
        .filter(({ id }) => open.has(id))
        .flatMap((group) => group.steps);
      const client = this.client();
      untracked(() => this.load(steps, client));
    });
  }

  /**
   * Asks for the formulas of every line as the page is printed. What comes too late prints its text, and
   * is there the next time: asking for all beforehand would fill the log with what nobody reads.
   */
  protected loadAll(): void {
    this.load(this.answer().steps ?? [], this.client());
  }

  /** Opens the working of a verification and brings it into view. */
  show(id: string): void {
    this.toggle(id, true);
    const group = this.host.querySelector<HTMLElement>(`[data-group="${CSS.escape(id)}"]`);
    group?.scrollIntoView({ block: 'start' });
    group?.querySelector('summary')?.focus({ preventScroll: true });
  }

  protected toggle(id: string, open: boolean): void {
    if (this.open().has(id) === open) return;
    const next = new Set(this.open());
    if (open) next.add(id);
    else next.delete(id);
    this.open.set(next);
  }

  protected readonly allOpen = computed(() => this.groups().every(({ id }) => this.open().has(id)));

  /** Opens the working of every verification, or closes all. */
  protected toggleAll(): void {
    const ids = this.allOpen() ? [] : this.groups().map(({ id }) => id);
    this.open.set(new Set(ids));
  }

  protected isOpen(event: Event): boolean {
    return (event.target as HTMLDetailsElement).open;
  }

  private load(steps: readonly Step[], client: ApiClient): void {
    const known = this.formulas();
    const ids = new Set(steps.map(({ formula }) => formula).filter((id) => id !== null));
    for (const id of ids) {
      if (known.has(id)) continue;
      client.formula(id).then(
        (formula) => this.formulas.update((before) => new Map(before).set(id, formula)),
        () => undefined,
      );
    }
  }
}
