import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  input,
  linkedSignal,
  model,
  output,
  signal,
  untracked,
  viewChild,
  type ElementRef,
  ViewEncapsulation,
} from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { catchError, debounceTime, from, of, Subject, switchMap } from 'rxjs';
import type { ApiClient } from '../api/api-client';
import type { CatalogueShape, SectionLine } from '../contract';
import { FaultNote } from '../fields/fault-note';
import type { FieldFault } from '../form/field-reader';
import { uniqueId } from '../look/unique-id';
import { readable } from '../quantity/format';

const PAUSE = 200;
const MOST = 30;

/**
 * A section by its designation in any spelling. The catalogue is searched while it is typed; where
 * it is away the text counts as it stands.
 */
@Component({
  selector: 'htc-section-picker',
  templateUrl: './section-picker.html',
  imports: [FaultNote],
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class SectionPicker {
  /** The designation as it is typed or picked. */
  readonly text = model('');
  /** Where the catalogue is searched. */
  readonly client = input.required<ApiClient>();
  /** The shapes that are offered; none named, all are. */
  readonly shapes = input<readonly CatalogueShape[]>([]);
  readonly readonly = input(false);
  readonly fault = input<FieldFault>();
  /** How often the form was filled from outside: what is half typed then goes. */
  readonly round = input(0);

  /** Whether something is typed that does not count yet: no answer belongs to it. */
  readonly pending = output<boolean>();

  protected readonly id = uniqueId();
  /** The text while it is typed, before it counts. */
  protected readonly typed = linkedSignal<[string, number], string>({
    source: () => [this.text(), this.round()],
    computation: ([text]) => text,
  });
  private readonly list = viewChild<ElementRef<HTMLElement>>('list');
  private readonly searched = new Subject<string>();
  protected readonly lines = signal<readonly SectionLine[]>([]);
  protected readonly open = signal(false);
  /** Whether the catalogue answered and holds nothing like the text. */
  protected readonly nothing = signal(false);
  protected readonly active = signal(-1);
  protected readonly activeId = computed(() =>
    this.open() && this.active() >= 0 ? `${this.id}-${this.active()}` : null,
  );

  constructor() {
    effect(() => this.pending.emit(this.typed() !== this.text()));
    effect(() => {
      if (this.round() > 0) untracked(() => this.close());
    });
    const none: readonly SectionLine[] | null = null;
    this.searched
      .pipe(
        debounceTime(PAUSE),
        switchMap((text) =>
          text.trim() === ''
            ? of(none)
            : from(this.search(text.trim())).pipe(catchError(() => of(none))),
        ),
        takeUntilDestroyed(),
      )
      .subscribe((found) => this.show(found));
  }

  protected type(event: Event): void {
    const text = (event.target as HTMLInputElement).value;
    this.typed.set(text);
    this.searched.next(text);
  }

  /** What is typed counts once it is left, or once the catalogue holds it or cannot tell. */
  protected commit(): void {
    if (this.typed() !== this.text()) this.text.set(this.typed());
  }

  protected leave(): void {
    this.commit();
    this.close();
  }

  protected press(event: KeyboardEvent): void {
    const count = this.lines().length;
    if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      event.preventDefault();
      if (!this.open()) this.searched.next(this.typed());
      else if (count > 0)
        this.move((this.active() + (event.key === 'ArrowDown' ? 1 : -1) + count) % count);
    } else if (event.key === 'Enter') {
      event.preventDefault();
      const line = this.open() ? this.lines()[this.active()] : undefined;
      if (line) this.pick(line);
      else this.leave();
    } else if (event.key === 'Escape' && this.open()) {
      event.preventDefault();
      event.stopPropagation();
      this.close();
    }
  }

  protected pick(line: SectionLine): void {
    this.typed.set(line.designation);
    this.leave();
  }

  protected close(): void {
    this.open.set(false);
    this.nothing.set(false);
    this.active.set(-1);
    this.searched.next('');
  }

  /** "67.1 kg/m, 453.4 × 189.9": what is known of a section that its name does not say. */
  protected facts({ shape, forming, mass, dimensions }: SectionLine): string {
    const named = shape !== undefined && shape !== 'I' && shape !== 'channel';
    const sizes = (named ? [] : [dimensions?.h, dimensions?.b])
      .filter((size) => size !== undefined)
      .map(({ value }) => readable(value));
    const weight = mass ? `${readable(mass.value)} kg/m` : '';
    return [weight, sizes.join(' × '), forming].filter(Boolean).join(', ');
  }

  private async search(text: string): Promise<readonly SectionLine[]> {
    const shapes = this.shapes();
    if (shapes.length === 0) return this.client().sections(text);
    const found = await Promise.all(shapes.map((shape) => this.client().sections(text, shape)));
    return found.flat();
  }

  private show(found: readonly SectionLine[] | null): void {
    const lines = (found ?? []).slice(0, MOST);
    const settled = lines.length === 1 && lines[0]?.designation === this.typed();
    const told = lines.length > 1 && !lines.some((line) => alike(line.designation, this.typed()));
    if (!told) this.commit();
    this.lines.set(lines);
    this.open.set(lines.length > 0 && !settled);
    this.nothing.set(found !== null && lines.length === 0);
    this.active.set(-1);
  }

  private move(to: number): void {
    this.active.set(to);
    this.list()?.nativeElement.children[to]?.scrollIntoView({ block: 'nearest' });
  }
}

/** Whether both are one designation, but for spaces and case. */
function alike(a: string, b: string): boolean {
  const plain = (text: string) => text.replace(/\s/g, '').toLowerCase();
  return plain(a) === plain(b);
}
