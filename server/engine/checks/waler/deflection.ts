import { bays, type Bay } from '../../analysis/bays';
import { deflectionExtremes } from '../../analysis/deflection';
import { greatest } from '../../analysis/extremes';
import { WorkingSheet } from '../../formula/sheet';
import { deflectionCriterion, deflectionLimitOfSpan } from '../../steel/deflection';
import type { WalerRequest } from '../contract';
import type { SolvedCase } from '../continuous/solve';
import type { Finding } from '../verification';

/** A limit of the deflection with the id and symbol of its verification. */
export interface Limit {
  readonly id: 'deflection' | 'deflection-final' | 'deflection-net-final';
  readonly symbol: string;
  /** The n of `span/n`. */
  readonly ratio: number;
}

/** The limits of a request. Steel does not creep: final and net final deflections are those at once. */
export function limitsOf(limit: WalerRequest['deflectionLimit']): Limit[] {
  if (limit === undefined) return [];
  const given = typeof limit === 'string' ? { instant: limit } : limit;
  const named = [
    ['deflection', 'w_inst', given.instant],
    ['deflection-final', 'w_fin', given.final],
    ['deflection-net-final', 'w_net_fin', given.netFinal],
  ] as const;
  return named.flatMap(([id, symbol, text]) =>
    text === undefined ? [] : [{ id, symbol, ratio: Number(text.slice('span/'.length)) }],
  );
}

interface Worst {
  readonly solved: SolvedCase;
  readonly bay: Bay;
  readonly span: number;
  readonly x: number;
  readonly w_inst: number;
  readonly L: number;
}

/** Each limit against the worst deflection of all serviceability combinations, if there are any. */
export function verifyDeflections(
  cases: readonly SolvedCase[],
  limits: readonly Limit[],
  withSteps: boolean,
): Finding[] {
  let worst: Worst | null = null;
  for (const solved of cases) {
    if (!solved.state || solved.combination.situation !== 'serviceability') continue;
    for (const bay of bays(solved.state)) {
      const { span, x, value } = greatest(deflectionExtremes(solved.state, bay));
      const L = bay.kind === 'overhang' ? 2 * bay.length : bay.length;
      const w_inst = Math.abs(value);
      if (!worst || w_inst / L > worst.w_inst / worst.L)
        worst = { solved, bay, span, x, w_inst, L };
    }
  }
  const found = worst;
  return found ? limits.map((limit) => findingOf(found, limit, withSteps)) : [];
}

function findingOf(
  { solved, span, x, w_inst, L }: Worst,
  { id, symbol, ratio }: Limit,
  withSteps: boolean,
): Finding {
  const sheet = new WorkingSheet(id, withSteps);
  sheet.given(symbol, w_inst, 'mm', 'Deflection relative to the chord of the supports', 'Analysis');
  const w_lim = sheet.evaluate(deflectionLimitOfSpan, { L, ratio });
  sheet.evaluate(deflectionCriterion, { w: w_inst, w_lim });
  return {
    id,
    title: deflectionCriterion.title,
    clause: deflectionCriterion.clause,
    effect: { symbol, value: w_inst, unit: 'mm' },
    resistance: { symbol: 'w_lim', value: w_lim, unit: 'mm' },
    combination: solved.id,
    place: { span, x },
    sheet,
  };
}
