import type { Solution, SupportSums, UnitCases } from './unit-cases';

/** A reaction this small a share of all loads is neither push nor pull. */
const NOTHING = 1e-9;

/**
 * Σ factor × case on supports that only push.
 *
 * The support that pulls most is taken away and the rest solved again until none pulls; then a
 * support that was taken away comes back if the member would go through it. Should that go round
 * in circles, {@link fromStandingPair} finds the one answer there is.
 *
 * A mechanism: the loads' resultant does not press the member on to its supports, or lies beyond
 * the outermost of them; loads that balance among themselves do not press it on either. Without
 * load the unloaded state on all supports is the answer.
 *
 * @param factors one for each case, without unit.
 * @param available indices of the supports that are there, ascending; all by default.
 */
export function solveCompressionOnly(
  cases: UnitCases,
  factors: ArrayLike<number>,
  available: readonly number[] = cases.beam.allSupports,
): Solution {
  const { force, moment, size } = cases.resultant(factors);
  if (size === 0) return cases.combine(factors, available);
  const nothing = NOTHING * size;
  if (available.length < 2 || !stands(cases, available, force, moment, nothing)) {
    return { kind: 'mechanism' };
  }
  let acting = available;
  const seen = new Set<string>();
  for (;;) {
    const sums = cases.supportSums(factors, acting);
    const key = acting.join();
    if (!sums || seen.has(key)) {
      const found = fromStandingPair(cases, factors, available, nothing);
      return found ? solution(cases, factors, available, found) : { kind: 'mechanism' };
    }
    seen.add(key);
    const pulling = least(acting, sums.reactions);
    if (sums.reactions[pulling]! < -nothing) {
      acting = acting.filter((s) => s !== pulling);
      continue;
    }
    const entered = mostEntered(available, acting, sums);
    if (entered === null) return solution(cases, factors, available, acting);
    acting = including(acting, entered);
  }
}

/** Whether forces that only push, at the available supports, can balance the loads. */
function stands(
  { beam: { frame } }: UnitCases,
  available: readonly number[],
  force: number,
  moment: number,
  nothing: number,
): boolean {
  const length = frame.breaks[frame.breaks.length - 1]! - frame.breaks[0]!;
  const first = frame.supports[available[0]!]!;
  const last = frame.supports[available[available.length - 1]!]!;
  return (
    force > nothing &&
    moment >= first * force - nothing * length &&
    moment <= last * force + nothing * length
  );
}

/**
 * Starts on the outermost two supports, which stand by statics, and takes in the support that the
 * member enters deepest; supports whose push falls to nothing on the way drop out. The
 * complementary energy falls with every step, so that no set comes twice (Lawson and Hanson).
 */
export function fromStandingPair(
  cases: UnitCases,
  factors: ArrayLike<number>,
  available: readonly number[],
  nothing: number,
): readonly number[] | null {
  let acting: readonly number[] = [available[0]!, available[available.length - 1]!];
  let sums = cases.supportSums(factors, acting);
  for (let round = 0; sums && round < 10 * available.length; round++) {
    const entered = mostEntered(available, acting, sums);
    if (entered === null) return acting;
    let trial = including(acting, entered);
    let pushes = Float64Array.from(sums.reactions);
    let next = cases.supportSums(factors, trial);
    if (next && next.reactions[entered]! <= nothing) return acting;
    while (next && next.reactions[least(trial, next.reactions)]! < -nothing) {
      const target = next.reactions;
      let step = 1;
      for (const s of trial) {
        const push = Math.max(pushes[s]!, 0);
        if (target[s]! < -nothing) step = Math.min(step, push / (push - target[s]!));
      }
      const reached: Float64Array<ArrayBuffer> = pushes.map(
        (push, s) => push + step * (target[s]! - push),
      );
      trial = trial.filter((s) => target[s]! >= -nothing || reached[s]! > nothing);
      pushes = reached;
      next = cases.supportSums(factors, trial);
    }
    acting = trial;
    sums = next;
  }
  return sums ? acting : null;
}

function solution(
  cases: UnitCases,
  factors: ArrayLike<number>,
  available: readonly number[],
  acting: readonly number[],
): Solution {
  const found = cases.combine(factors, acting);
  if (found.kind === 'mechanism') return found;
  return { ...found, lifted: available.filter((s) => !acting.includes(s)) };
}

function least(supports: readonly number[], values: Float64Array): number {
  return supports.reduce((a, b) => (values[b]! < values[a]! ? b : a));
}

/** The support not acting that the member goes through deepest, if there is one. */
function mostEntered(
  available: readonly number[],
  acting: readonly number[],
  { deflections }: SupportSums,
): number | null {
  const scale = deflections.reduce((a, w) => Math.max(a, Math.abs(w)), 0);
  let deepest: number | null = null;
  for (const s of available) {
    if (acting.includes(s) || deflections[s]! <= NOTHING * scale) continue;
    if (deepest === null || deflections[s]! > deflections[deepest]!) deepest = s;
  }
  return deepest;
}

function including(acting: readonly number[], support: number): number[] {
  return [...acting, support].sort((a, b) => a - b);
}
