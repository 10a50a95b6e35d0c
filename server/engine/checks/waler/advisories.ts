import type { AdvisoryAnswer, WalerRequest } from '../contract';
import type { SolvedCase } from '../continuous/solve';
import type { SteelISection } from '../steel-i/section';

/** What a competent reader of the answer will want to know. */
export function advisoriesOf(
  request: WalerRequest,
  section: SteelISection,
  cases: readonly SolvedCase[],
  arrangementsComplete: boolean,
): AdvisoryAnswer[] {
  const list: AdvisoryAnswer[] = [];
  if (section.gamma_M0 < 1.1) {
    list.push({
      code: 'material-factor-below-1.10',
      severity: 'caution',
      message: `The profile takes gamma_M0 = ${section.gamma_M0}. For steel temporary works, other than single-use, BS 5975 asks for at least 1.10.`,
      clause: 'BS 5975:2019 13.3.9',
    });
  }
  if (section.count > 1 && !section.connected) {
    list.push({
      code: 'unequal-sharing',
      severity: 'caution',
      message: `One of ${section.count} members is taken to carry ${section.share} of the whole. Nothing that is stated here makes them share so.`,
    });
  }
  const lifted = cases.filter((one) => one.lifted.length > 0);
  if (lifted.length > 0) {
    const supports = [...new Set(lifted.flatMap((one) => one.lifted))].sort((a, b) => a - b);
    list.push({
      code: 'support-lifts',
      severity: 'info',
      message: `The waler leaves ${supports.length === 1 ? 'prop' : 'props'} ${supports.join(', ')} in ${lifted.length} of ${cases.length} combinations; those are solved without.`,
    });
  }
  if (request.patternLoading === false) {
    list.push({
      code: 'no-pattern-loading',
      severity: 'caution',
      message:
        'Variable loads are taken on all spans or on none, as asked. Span by span they may do more.',
      clause: 'EN 1990 6.4.3.1(4)',
    });
  }
  if (!arrangementsComplete) {
    list.push({
      code: 'arrangements-not-all',
      severity: 'caution',
      message:
        'Props lift or give under variable loads over more spans than every arrangement is solved for: all, none, every second span and the neighbours of each prop were. Other arrangements may do more.',
      clause: 'EN 1990 6.4.3.1(4)',
    });
  }
  return list;
}
