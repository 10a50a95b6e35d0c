/** The lengths that a variable load may stand on: overhangs and spans, in order. */
export interface Panels {
  readonly spans: number;
  readonly start: boolean;
  readonly end: boolean;
}

/** Which lengths a pattern of the answer loads; null where its name is not known here. */
function loadedPanels(pattern: string, count: number): boolean[] | null {
  const panels = Array.from({ length: count }, (_, index) => index);
  if (pattern === 'all') return panels.map(() => true);
  if (pattern === 'none') return panels.map(() => false);
  if (pattern === 'odd') return panels.map((index) => index % 2 === 0);
  if (pattern === 'even') return panels.map((index) => index % 2 === 1);
  const beside = /^(without-)?neighbours-(\d+)$/.exec(pattern);
  if (beside) {
    const left = Number(beside[2]) - 1;
    const near = (index: number) => (index <= left ? left - index : index - left - 1) % 2 === 0;
    return panels.map((index) => near(index) === (beside[1] === undefined));
  }
  const bits = /^panels-([01]+)$/.exec(pattern)?.[1];
  return bits?.length === count ? Array.from(bits, (bit) => bit === '1') : null;
}

/**
 * Where the variable loads stand, in words.
 *
 * @example patternText('neighbours-1', { spans: 4, start: false, end: false }) // 'on spans 1, 2 and 4'
 */
export function patternText(pattern: string | null, { spans, start, end }: Panels): string {
  if (pattern === null || pattern === 'none') return '';
  const loaded = loadedPanels(pattern, spans + Number(start) + Number(end));
  if (!loaded) return pattern;
  if (loaded.every((on) => on)) return spans === 1 ? '' : 'on every span';
  const inner = loaded.slice(Number(start), Number(start) + spans);
  const numbers = inner.flatMap((on, index) => (on ? [String(index + 1)] : []));
  const places = [
    ...(start && loaded[0] ? ['the start overhang'] : []),
    ...(numbers.length > 0
      ? [`${numbers.length === 1 ? 'span' : 'spans'} ${listed(numbers)}`]
      : []),
    ...(end && loaded.at(-1) ? ['the end overhang'] : []),
  ];
  return places.length > 0 ? `on ${listed(places)}` : '';
}

/** "1", "1 and 2", "1, 2 and 3". */
export function listed(words: readonly string[]): string {
  if (words.length < 2) return words.join('');
  return `${words.slice(0, -1).join(', ')} and ${words.at(-1) ?? ''}`;
}
