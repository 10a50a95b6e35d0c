import { effect, signal, untracked, type Signal } from '@angular/core';
import type { ApiClient } from '../api/api-client';
import type { SectionLine } from '../contract';

/**
 * What the catalogue holds of a designation, for its drawing while nothing is answered yet; null
 * while it is not known. Made where it is injected.
 */
export function catalogueLine(
  client: Signal<ApiClient>,
  designation: () => string,
): Signal<SectionLine | null> {
  const line = signal<SectionLine | null>(null);
  effect((onCleanup) => {
    const name = designation().trim();
    const at = client();
    if (untracked(line)?.designation !== name) line.set(null);
    if (name.length < 2 || at.obstacle) return;
    let isMeant = true;
    onCleanup(() => (isMeant = false));
    at.sections(name).then(
      (found) => {
        if (isMeant) line.set(meant(found, name));
      },
      // Without it the section is drawn from the answer.
      () => undefined,
    );
  });
  return line.asReadonly();
}

/** The one that is spelled so, or the only one that is like it. */
function meant(found: readonly SectionLine[], name: string): SectionLine | null {
  const plain = (text: string): string => text.replace(/\s/g, '').toLowerCase();
  const same = found.find(({ designation }) => plain(designation) === plain(name));
  return same ?? (found.length === 1 ? (found[0] ?? null) : null);
}
