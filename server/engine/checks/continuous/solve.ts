import { factorOf, type Combination } from '../../actions/action';
import type { BeamGeometry, BeamLoad } from '../../analysis/beam.types';
import type { BeamState } from '../../analysis/beam-state';
import { loadsByPanel } from '../../analysis/clip-load';
import { solveCompressionOnly } from '../../analysis/compression-only';
import { ContinuousBeam } from '../../analysis/continuous-beam';
import { UnitCases } from '../../analysis/unit-cases';
import { refuse } from '../refuse';
import {
  everyArrangement,
  senseOf,
  usualArrangements,
  type Arrangement,
  type Sense,
} from './arrangements';
import type { LoadCaseSet } from './load-sets';
import type { ActionLoads } from './loads';

export type SupportKind = 'compression-only' | 'both-ways';

/** One combination with its arrangement of variable loads, solved on the supports that hold. */
export interface SolvedCase {
  readonly id: string;
  readonly loadSet: string | null;
  readonly combination: Combination;
  /** Null where no variable load comes span by span. */
  readonly arrangement: Arrangement | null;
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

/** One unit case: an action, whole (panel null) or its loads of one sense on one panel. */
interface CaseSlot {
  readonly action: ActionLoads;
  readonly panel: number | null;
  readonly sense: Sense;
  readonly loads: readonly BeamLoad[];
}

/** All combinations of a request, solved. */
export interface SolvedCases {
  readonly cases: readonly SolvedCase[];
  /**
   * Whether the arrangements of variable loads hold the greatest effect of every arrangement there
   * is. Beyond that many panels they may not, where supports lift or give.
   */
  readonly arrangementsComplete: boolean;
}

/** Solving and verifying more numbers than this would hold the caller up for many seconds. */
const MOST_WORK = 1_000_000;

/**
 * Solves every combination of every set, each with the arrangements of its variable loads.
 *
 * On rigid supports that all hold, 2n + 2 arrangements give the full envelope, loads that pull
 * standing where those that push do not. Where a support lifts or gives under one of them they may
 * fall short, and every arrangement is solved.
 *
 * @throws {Refusal} `too-many-combinations`
 */
export function solveCases(
  geometry: BeamGeometry,
  sets: readonly LoadCaseSet[],
  supports: SupportKind,
): SolvedCases {
  // One beam for all sets, so that their states have the same breakpoints and one envelope.
  const beam = new ContinuousBeam(
    geometry,
    sets.flatMap(({ actions }) => actions.flatMap(loadsOf)),
  );
  const cases: SolvedCase[] = [];
  let arrangementsComplete = true;
  for (const set of sets) {
    const source = caseSource(beam, set);
    for (const combination of set.combinations) {
      const solve = (arrangement: Arrangement | null): SolvedCase =>
        solveCase(set.id, combination, arrangement, source, supports);
      const { solved, complete } = solveArrangements(combination, source, solve);
      arrangementsComplete &&= complete;
      cases.push(...solved);
      refuseTooMuch(cases.length * beam.frame.pieces, set);
    }
  }
  return {
    cases: cases.map((one, index) => ({ ...one, id: `C${index + 1}` })),
    arrangementsComplete,
  };
}

function refuseTooMuch(work: number, set: LoadCaseSet): void {
  if (work <= MOST_WORK) return;
  refuse(
    'too-many-combinations',
    set.id === null ? '/loads' : '/loadSets',
    'The sources of load have too many combinations and arrangements over so many spans; name fewer sources or divide the member.',
  );
}

function solveArrangements(
  combination: Combination,
  source: CaseSource,
  solve: (arrangement: Arrangement | null) => SolvedCase,
): { readonly solved: SolvedCase[]; readonly complete: boolean } {
  const senses = arrangedSenses(combination, source);
  if (senses.size === 0) return { solved: [solve(null)], complete: true };
  const { frame } = source.units.beam;
  const panels = frame.panels.length;
  const usual = usualArrangements(panels, senses).map(solve);
  const gives = frame.geometry.supportStiffness.some((stiffness) => stiffness !== null);
  const lifts = usual.some(({ state, lifted }) => state === null || lifted.length > 0);
  // What a couple does to its neighbours has no panels of one sign: no usual arrangement is sure.
  if (!gives && !lifts && !senses.has('turning')) return { solved: usual, complete: true };
  const every = everyArrangement(panels, senses);
  return every ? { solved: every.map(solve), complete: true } : { solved: usual, complete: false };
}

/** Senses of the variable loads of the combination that come span by span. */
function arrangedSenses(combination: Combination, { slots }: CaseSource): Set<Sense> {
  const acting = slots.filter(
    ({ panel, action }) => panel !== null && factorOf(combination, action.action.name) !== 0,
  );
  return new Set(acting.map(({ sense }) => sense));
}

function loadsOf({ bySpan, whole }: ActionLoads): readonly BeamLoad[] {
  return [...bySpan, ...whole];
}

function caseSource(beam: ContinuousBeam, set: LoadCaseSet): CaseSource {
  const slots = set.actions.flatMap((action): CaseSlot[] => [
    { action, panel: null, sense: 'towards', loads: action.whole },
    ...loadsByPanel(action.bySpan, beam.frame.panels).flatMap((loads, panel) =>
      (['towards', 'away', 'turning'] as const).map((sense) => ({
        action,
        panel,
        sense,
        loads: loads.filter((load) => senseOf(load) === sense),
      })),
    ),
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

function solveCase(
  loadSet: string | null,
  combination: Combination,
  arrangement: Arrangement | null,
  source: CaseSource,
  supports: SupportKind,
): SolvedCase {
  const factors = slotFactors(source, arrangement, (name) => factorOf(combination, name));
  const solution =
    supports === 'compression-only'
      ? solveCompressionOnly(source.units, factors)
      : source.units.combine(factors);
  const base = { id: '', loadSet, combination, arrangement, source };
  return solution.kind === 'mechanism'
    ? { ...base, state: null, lifted: [] }
    : { ...base, state: solution.state, lifted: solution.lifted.map((index) => index + 1) };
}

/** The factor of each unit case: that of its action where the arrangement puts it there. */
export function slotFactors(
  { slots }: CaseSource,
  arrangement: Arrangement | null,
  factor: (action: string) => number,
): number[] {
  return slots.map(({ action, panel, sense }) =>
    panel === null || arrangement === null || arrangement.loaded[sense][panel] === true
      ? factor(action.action.name)
      : 0,
  );
}
