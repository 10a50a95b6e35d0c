import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  ViewEncapsulation,
} from '@angular/core';
import type { Reaction } from '../contract';
import { Scrolls } from '../look/scrolls';
import { fixed } from '../quantity/format';

interface Cell {
  readonly min: number;
  readonly max: number;
}

/** What each prop carries: by action, in persistent and accidental combinations, in service. */
@Component({
  selector: 'htc-reactions-table',
  templateUrl: './reactions-table.html',
  imports: [Scrolls],
  host: { class: 'ht-figure' },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class ReactionsTable {
  readonly reactions = input.required<readonly Reaction[]>();

  protected readonly fixed = fixed;
  protected readonly actions = computed(() => {
    const names = this.reactions().flatMap(({ byAction }) => byAction.map(({ name }) => name));
    return [...new Set(names)];
  });
  protected readonly accidental = computed(() =>
    this.reactions().some(({ design }) => design.accidental !== null),
  );
  protected readonly service = computed(() =>
    this.reactions().some(({ serviceability }) => serviceability !== null),
  );

  protected action(reaction: Reaction, name: string): Cell | null {
    return reaction.byAction.find((one) => one.name === name) ?? null;
  }

  /** "107.5 to 195.3", or one number where both are the same. */
  protected range(cell: Cell | null): string {
    if (!cell) return '–';
    const [least, most] = [fixed(cell.min, 1), fixed(cell.max, 1)];
    return least === most ? most : `${least} to ${most}`;
  }
}
