import type { AdvisoryAnswer, WalerRequest } from '../contract';
import type { SolvedCase } from '../continuous/solve';
import { sectionAdvisories } from '../steel/advisories';
import type { SteelSection } from '../steel/section';

/** What a competent reader of the answer will want to know. */
export function advisoriesOf(
  request: WalerRequest,
  section: SteelSection,
  cases: readonly SolvedCase[],
): AdvisoryAnswer[] {
  const list = sectionAdvisories(section);
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
      message: `The waler leaves ${supports.length === 1 ? 'prop' : 'props'} ${supports.join(', ')} in ${lifted.length} of ${cases.length} combinations; those are solved without. Its own weight is taken to hang on every prop.`,
    });
  }
  const loads = request.loads ?? (request.loadSets ?? []).flatMap((set) => set.loads);
  const whole = loads.some(
    ({ nature, patternLoading }) => nature === 'variable' && patternLoading === false,
  );
  if (request.patternLoading === false || whole) {
    list.push({
      code: 'no-pattern-loading',
      severity: 'caution',
      message:
        'Variable loads are taken on all spans or on none, as asked. Span by span they may do more.',
      clause: 'EN 1990 6.4.3.1(4)',
    });
  }
  list.push(...setsByOne(request, cases), ...settlement(cases));
  return list;
}

/** Characteristic values that no factor meets: right for values factored beforehand, wrong else. */
function setsByOne(request: WalerRequest, cases: readonly SolvedCase[]): AdvisoryAnswer[] {
  if (request.loadBasis === 'design') return [];
  const byOne = cases.filter(
    ({ combination }) =>
      combination.situation === 'persistent' && combination.expression === 'none',
  );
  const sets = [...new Set(byOne.map(({ loadSet }) => loadSet ?? ''))];
  if (sets.length === 0) return [];
  return [
    {
      code: 'set-not-factored',
      severity: 'caution',
      message: `The values of ${sets.join(', ')} are not factored, as asked ("none"): they must hold their partial factors already.`,
      clause: 'EN 1990 6.3.1',
    },
  ];
}

/** Deflection is relative to the chord of the props; how far elastic props give is said apart. */
function settlement(cases: readonly SolvedCase[]): AdvisoryAnswer[] {
  let most = 0;
  for (const { state, combination } of cases) {
    if (!state || combination.situation !== 'serviceability') continue;
    if (state.frame.geometry.supportStiffness.every((stiffness) => stiffness === null)) return [];
    for (const support of state.acting) {
      most = Math.max(most, Math.abs(state.supportDeflections[support] ?? 0));
    }
  }
  if (most === 0) return [];
  return [
    {
      code: 'props-give',
      severity: 'caution',
      message: `Elastic props give by up to ${most.toPrecision(3)} mm in serviceability; the deflection is relative to the line through them.`,
    },
  ];
}
