import type { BeamLoad } from '../../analysis/beam.types';
import { everyPattern, loadPatterns, type LoadPattern } from '../../analysis/load-patterns';

/** Which way a load acts; loads of unlike senses have their worst arrangements on unlike panels. */
export type Sense = 'towards' | 'away' | 'turning';

/** Where variable loads of each sense stand, panel by panel. */
export interface Arrangement {
  readonly name: string;
  readonly loaded: Readonly<Record<Sense, readonly boolean[]>>;
}

/** The sense of a load that does not change it along its length, see {@link bySense}. */
export function senseOf(load: BeamLoad): Sense {
  if (load.kind === 'moment') return 'turning';
  const value = load.kind === 'point' ? load.value : load.start + load.end;
  return value < 0 ? 'away' : 'towards';
}

/** A load in parts of one sense each: a line load that passes through nothing is cut there. */
export function bySense(load: BeamLoad): BeamLoad[] {
  if (load.kind !== 'distributed' || load.start * load.end >= 0) return [load];
  const { from, to, start, end } = load;
  const at = from + ((to - from) * start) / (start - end);
  return [
    { ...load, to: at, end: 0 },
    { ...load, from: at, start: 0 },
  ];
}

function alike({ name, loaded }: LoadPattern): Arrangement {
  return { name, loaded: { towards: loaded, away: loaded, turning: loaded } };
}

/**
 * The usual arrangements of loads of these senses. Loads that pull stand where those that push do
 * not: a panel that relieves the one worsens the other.
 */
export function usualArrangements(panels: number, senses: ReadonlySet<Sense>): Arrangement[] {
  const patterns = loadPatterns(panels);
  if (senses.size <= 1) return patterns.map(alike);
  return patterns.flatMap(({ name, loaded }): Arrangement[] => {
    const rest = loaded.map((on) => !on);
    return [
      { name, loaded: { towards: loaded, away: loaded, turning: loaded } },
      {
        name: `${name}, pull on the rest`,
        loaded: { towards: loaded, away: rest, turning: loaded },
      },
    ];
  });
}

/** More arrangements of one combination than are solved. */
const MOST_ARRANGEMENTS = 1024;

/** Every arrangement there is of loads of these senses; null where there are too many. */
export function everyArrangement(panels: number, senses: ReadonlySet<Sense>): Arrangement[] | null {
  if (2 ** (panels * Math.max(senses.size, 1)) > MOST_ARRANGEMENTS) return null;
  const patterns = everyPattern(panels);
  return [...senses].reduce<Arrangement[]>(
    (made, sense) =>
      made.flatMap((one) =>
        patterns.map(({ name, loaded }) => ({
          name: senses.size > 1 ? `${one.name} ${sense} ${name}`.trim() : name,
          loaded: { ...one.loaded, [sense]: loaded },
        })),
      ),
    [{ name: '', loaded: { towards: [], away: [], turning: [] } }],
  );
}
