import {
  ChangeDetectionStrategy,
  Component,
  computed,
  ElementRef,
  input,
  model,
  signal,
  viewChild,
  ViewEncapsulation,
} from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { catchError, debounceTime, from, of, Subject, switchMap } from 'rxjs';
import type { ApiClient } from '../api/api-client';
import type { SectionLine } from '../contract';
import { FaultNote } from '../fields/fault-note';
import type { FieldFault } from '../form/read-draft';
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
  readonly readonly = input(false);
  readonly fault = input<FieldFault>();

  protected readonly id = uniqueId();
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
    const none: readonly SectionLine[] | null = null;
    this.searched
      .pipe(
        debounceTime(PAUSE),
        switchMap((text) =>
          text.trim() === ''
            ? of(none)
            : from(this.client().sections(text.trim())).pipe(catchError(() => of(none))),
        ),
        takeUntilDestroyed(),
      )
      .subscribe((found) => this.show(found));
  }

  protected type(event: Event): void {
    const text = (event.target as HTMLInputElement).value;
    this.text.set(text);
    this.searched.next(text);
  }

  protected press(event: KeyboardEvent): void {
    const count = this.lines().length;
    if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      event.preventDefault();
      if (!this.open()) this.searched.next(this.text());
      else if (count > 0)
        this.move((this.active() + (event.key === 'ArrowDown' ? 1 : -1) + count) % count);
    } else if (event.key === 'Enter' && this.open()) {
      event.preventDefault();
      const line = this.lines()[this.active()];
      if (line) this.pick(line);
    } else if (event.key === 'Escape' && this.open()) {
      event.preventDefault();
      event.stopPropagation();
      this.close();
    }
  }

  protected pick(line: SectionLine): void {
    this.text.set(line.designation);
    this.close();
  }

  protected close(): void {
    this.open.set(false);
    this.nothing.set(false);
    this.active.set(-1);
    this.searched.next('');
  }

  /** "67.1 kg/m, 453.4 × 189.9": what is known of a section besides its name. */
  protected facts({ mass, h, b }: SectionLine): string {
    const number = (fact: SectionLine['mass']) => (typeof fact === 'object' ? fact.value : fact);
    const [m, depth, width] = [mass, h, b].map(number);
    const sizes = [depth, width].filter((size) => size !== undefined).map((size) => readable(size));
    return [m === undefined ? '' : `${readable(m)} kg/m`, sizes.join(' × ')]
      .filter(Boolean)
      .join(', ');
  }

  private show(found: readonly SectionLine[] | null): void {
    const lines = (found ?? []).slice(0, MOST);
    const settled = lines.length === 1 && lines[0]?.designation === this.text();
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
