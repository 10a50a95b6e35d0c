import { bays, type Bay } from '../../analysis/bays';
import { deflectionExtremes } from '../../analysis/deflection';
import { greatest } from '../../analysis/extremes';
import { WorkingSheet } from '../../formula/sheet';
import { deflectionCriterion, deflectionLimitOfSpan } from '../../steel/deflection';
import type { WalerRequest } from '../contract';
import type { SolvedCase } from '../continuous/solve';
import type { Finding } from '../verification';

/** The n of `span/n` for the deflection at once; undefined where no limit is set. */
export function instantRatio(limit: WalerRequest['deflectionLimit']): number | undefined {
  const text = typeof limit === 'string' ? limit : limit?.instant;
  return text === undefined ? undefined : Number(text.slice('span/'.length));
}

interface Worst {
  readonly solved: SolvedCase;
  readonly bay: Bay;
  readonly span: number;
  readonly x: number;
  readonly w_inst: number;
  readonly L: number;
}

/** The worst deflection of all serviceability combinations; null where there is none of those. */
export function verifyDeflection(
  cases: readonly SolvedCase[],
  ratio: number,
  withSteps: boolean,
): Finding | null {
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
  return worst && findingOf(worst, ratio, withSteps);
}

function findingOf(
  { solved, span, x, w_inst, L }: Worst,
  ratio: number,
  withSteps: boolean,
): Finding {
  const sheet = new WorkingSheet('deflection', withSteps);
  sheet.given(
    'w_inst',
    w_inst,
    'mm',
    'Deflection relative to the chord of the supports',
    'Analysis',
  );
  const w_lim = sheet.evaluate(deflectionLimitOfSpan, { L, ratio });
  sheet.evaluate(deflectionCriterion, { w_inst, w_lim });
  return {
    id: 'deflection',
    title: deflectionCriterion.title,
    clause: deflectionCriterion.clause,
    effect: { symbol: 'w_inst', value: w_inst, unit: 'mm' },
    resistance: { symbol: 'w_lim', value: w_lim, unit: 'mm' },
    combination: solved.id,
    place: { span, x },
    sheet,
  };
}
