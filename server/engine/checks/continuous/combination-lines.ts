import type { CombinationLine } from '../contract';
import type { SolvedCase } from './solve';

/** A combination as the answer lists it. */
export function combinationLine(solved: SolvedCase): CombinationLine {
  const { id, loadSet, combination, arrangement, lifted } = solved;
  const line: CombinationLine = {
    id,
    situation: combination.situation,
    expression: combination.expression,
    leading: combination.leading,
    factors: combination.factors,
    kMod: null,
    pattern: arrangement?.name ?? null,
    lostSupport: null,
    lifted: [...lifted],
  };
  return loadSet === null ? line : { ...line, loadSet };
}
