import type { Stretch } from './extremes';

/** Which panels (start overhang, spans, end overhang, in order) a variable load acts on. */
export interface LoadPattern {
  /** `all`, `none`, `odd`, `even`; `neighbours-2`: both panels of the inner support between panels 2 and 3; `without-neighbours-2`: its complement. */
  readonly name: string;
  /** One for each panel. */
  readonly loaded: readonly boolean[];
}

/**
 * The patterns of a variable load over n panels: all, none, odd and even ones, and for each inner
 * support both its neighbours with every second panel beyond, and the complement of that. On rigid
 * supports that act both ways these 2n + 2 give the full envelope of support moments, greatest
 * span moments, shears at supports, reactions and deflections for loads of one sign.
 *
 * They do not where effects stop alternating from span to span: on springs, on supports that lift,
 * and where a lost support makes two panels one bay (then {@link baywise} patterns do).
 * {@link everyPattern} covers those.
 *
 * Patterns that coincide are listed once: one panel has 2 (all, none), two panels have 4.
 */
export function loadPatterns(panelCount: number): LoadPattern[] {
  const panels = Array.from({ length: panelCount }, (_, i) => i);
  const patterns: LoadPattern[] = [];
  const seen = new Set<string>();
  const add = (name: string, loaded: readonly boolean[]) => {
    const key = loaded.map(Number).join('');
    if (seen.has(key)) return;
    seen.add(key);
    patterns.push({ name, loaded });
  };
  add(
    'all',
    panels.map(() => true),
  );
  add(
    'none',
    panels.map(() => false),
  );
  add(
    'odd',
    panels.map((i) => i % 2 === 0),
  );
  add(
    'even',
    panels.map((i) => i % 2 === 1),
  );
  for (let left = 0; left + 1 < panelCount; left++) {
    const loaded = panels.map((i) => (i <= left ? left - i : i - left - 1) % 2 === 0);
    add(`neighbours-${left + 1}`, loaded);
    add(
      `without-neighbours-${left + 1}`,
      loaded.map((on) => !on),
    );
  }
  return patterns;
}

/** All 2^n patterns, for the members whose envelope {@link loadPatterns} may miss. */
export function everyPattern(panelCount: number): LoadPattern[] {
  return Array.from({ length: 2 ** panelCount }, (_, bits) => {
    const loaded = Array.from(
      { length: panelCount },
      (_, i) => Math.floor(bits / 2 ** i) % 2 === 1,
    );
    return { name: `panels-${loaded.map(Number).join('')}`, loaded };
  });
}

/**
 * The patterns of {@link loadPatterns} made over bays (both ends in mm, such as `bays()` gives)
 * instead of panels: all panels of a bay are loaded together.
 */
export function baywise(panels: readonly Stretch[], bays: readonly Stretch[]): LoadPattern[] {
  const bayOf = panels.map(({ from, to }) =>
    bays.findIndex((bay) => (from + to) / 2 > bay.from && (from + to) / 2 < bay.to),
  );
  return loadPatterns(bays.length).map(({ name, loaded }) => ({
    name,
    loaded: bayOf.map((bay) => loaded[bay] === true),
  }));
}
