import type { Combination } from '../../actions/action';
import type { BeamGeometry, BeamLoad } from '../../analysis/beam.types';
import type { BeamState } from '../../analysis/beam-state';
import { loadsByPanel } from '../../analysis/clip-load';
import { solveCompressionOnly } from '../../analysis/compression-only';
import { ContinuousBeam } from '../../analysis/continuous-beam';
import { loadPatterns, type LoadPattern } from '../../analysis/load-patterns';
import { UnitCases } from '../../analysis/unit-cases';
import { refuse } from '../refuse';
import type { LoadCaseSet } from './load-sets';
import type { ActionLoads } from './loads';

export type SupportKind = 'compression-only' | 'both-ways';

/** One combination with its arrangement of variable loads, solved on the supports that hold. */
export interface SolvedCase {
  readonly id: string;
  readonly loadSet: string | null;
  readonly combination: Combination;
  /** Null where no variable load comes span by span. */
  readonly pattern: LoadPattern | null;
  /** Null: the member is a mechanism under this combination. */
  readonly state: BeamState | null;
  /** Supports that lift, counted from 1. */
  readonly lifted: readonly number[];
  /** For reactions by action: the unit cases and the factor of 1 on those that stand. */
  readonly source: CaseSource;
}

/** What the cases of one load set have in common. */
export interface CaseSource {
  readonly units: UnitCases;
  readonly slots: readonly CaseSlot[];
}

/** One unit case: an action, whole (panel null) or on one panel. */
interface CaseSlot {
  readonly action: ActionLoads;
  readonly panel: number | null;
  readonly loads: readonly BeamLoad[];
}

/** Solving and verifying more numbers than this would hold the caller up: about ten seconds' worth. */
const MOST_WORK = 40_000_000;

/**
 * Solves every combination of every set, each with every arrangement of its variable loads.
 *
 * @throws {Refusal} `too-many-combinations`
 */
export function solveCases(
  geometry: BeamGeometry,
  sets: readonly LoadCaseSet[],
  supports: SupportKind,
): SolvedCase[] {
  const solved: SolvedCase[] = [];
  // One beam for all sets, so that their states have the same breakpoints and one envelope.
  const beam = new ContinuousBeam(
    geometry,
    sets.flatMap(({ actions }) => actions.flatMap(loadsOf)),
  );
  const { frame } = beam;
  for (const set of sets) {
    const source = caseSource(beam, set);
    const patterns = loadPatterns(frame.panels.length);
    const work = set.combinations.length * patterns.length * frame.pieces * 40;
    if (work > MOST_WORK) {
      refuse(
        'too-many-combinations',
        set.id === null ? '/loads' : '/loadSets',
        `${set.combinations.length} combinations with ${patterns.length} arrangements each over ${frame.panels.length} spans are too many; name fewer sources of load or divide the member.`,
      );
    }
    for (const combination of set.combinations) {
      for (const pattern of patternsOf(combination, source, patterns)) {
        solved.push(
          solveCase(`C${solved.length + 1}`, set.id, combination, pattern, source, supports),
        );
      }
    }
  }
  return solved;
}

function loadsOf({ bySpan, whole }: ActionLoads): readonly BeamLoad[] {
  return [...bySpan, ...whole];
}

function caseSource(beam: ContinuousBeam, set: LoadCaseSet): CaseSource {
  const slots = set.actions.flatMap((action): CaseSlot[] => [
    { action, panel: null, loads: action.whole },
    ...loadsByPanel(action.bySpan, beam.frame.panels).map((loads, panel) => ({
      action,
      panel,
      loads,
    })),
  ]);
  const used = slots.filter(({ loads }) => loads.length > 0);
  return {
    slots: used,
    units: new UnitCases(
      beam,
      used.map(({ loads }) => loads),
    ),
  };
}

/** All arrangements where a variable load of the combination comes span by span, else none. */
function patternsOf(
  { factors, expression }: Combination,
  { slots }: CaseSource,
  patterns: readonly LoadPattern[],
): readonly (LoadPattern | null)[] {
  const arranged = slots.some(
    ({ panel, action }) => panel !== null && (factors[action.action.name] ?? 0) !== 0,
  );
  if (!arranged) return [null];
  // Among combinations the empty arrangement is the combination without its variable actions.
  return expression === 'none' ? patterns : patterns.filter(({ name }) => name !== 'none');
}

function solveCase(
  id: string,
  loadSet: string | null,
  combination: Combination,
  pattern: LoadPattern | null,
  source: CaseSource,
  supports: SupportKind,
): SolvedCase {
  const factors = slotFactors(source, pattern, (name) => combination.factors[name] ?? 0);
  const solution =
    supports === 'compression-only'
      ? solveCompressionOnly(source.units, factors)
      : source.units.combine(factors);
  const base = { id, loadSet, combination, pattern, source };
  return solution.kind === 'mechanism'
    ? { ...base, state: null, lifted: [] }
    : { ...base, state: solution.state, lifted: solution.lifted.map((index) => index + 1) };
}

/** The factor of each unit case: that of its action where the arrangement puts it there. */
export function slotFactors(
  { slots }: CaseSource,
  pattern: LoadPattern | null,
  factorOf: (action: string) => number,
): number[] {
  return slots.map(({ action, panel }) =>
    panel === null || pattern === null || pattern.loaded[panel] === true
      ? factorOf(action.action.name)
      : 0,
  );
}
