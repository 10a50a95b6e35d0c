import type { Sheet } from '../../formula/sheet';
import { equivalentStress, vonMisesCriterion, yieldLimit } from '../../steel/von-mises';
import type { NamedStress } from '../../stress/elastic-stress';
import { finding, side, type Sides } from '../cross-section/finding';
import type { Finding } from '../verification';

interface Yield {
  readonly f_y: number;
  readonly gamma_M0: number;
}

/** A state of stress in N/mm² with the name of its point. */
export interface NamedState {
  readonly id: string;
  readonly title: string;
  readonly sigma_x: number;
  readonly sigma_z: number;
  readonly tau: number;
  /** Where the numbers come from. */
  readonly source: string;
}

/** Von Mises' criterion at the named point where it is worst. */
export function vonMises(
  steel: Yield,
  stresses: readonly NamedStress[],
  withSteps: boolean,
): Finding {
  const states = stresses.map(({ station: { id, title }, sigma, tau }) => ({
    id,
    title,
    sigma_x: sigma,
    sigma_z: 0,
    tau,
    source: 'Elastic stress at the point',
  }));
  return worstOf(steel, states, withSteps);
}

/** Von Mises' criterion for the worst of some states. */
export function worstOf(steel: Yield, states: readonly NamedState[], withSteps: boolean): Finding {
  const size = ({ sigma_x, sigma_z, tau }: NamedState): number =>
    equivalentStress.compute({ sigma_x_Ed: sigma_x, sigma_z_Ed: sigma_z, tau_Ed: tau });
  const [first, ...rest] = states;
  if (!first) throw new Error('there is no state of stress');
  const worst = rest.reduce((most, one) => (size(one) > size(most) ? one : most), first);
  return {
    ...finding('von-mises', vonMisesCriterion, withSteps, (sheet) => write(steel, worst, sheet)),
    point: worst.id,
  };
}

function write({ f_y, gamma_M0 }: Yield, state: NamedState, sheet: Sheet): Sides {
  const at = (symbol: string, value: number, words: string): number =>
    sheet.given(symbol, value, 'N/mm^2', `${words}: ${state.title}`, state.source);
  const sigma_x_Ed = at('sigma_x_Ed', state.sigma_x, 'Stress along the member');
  const sigma_z_Ed = at('sigma_z_Ed', state.sigma_z, 'Stress across the member');
  const tau_Ed = at('tau_Ed', state.tau, 'Shear stress');
  const sigma_v_Ed = sheet.evaluate(equivalentStress, { sigma_x_Ed, sigma_z_Ed, tau_Ed });
  const sigma_Rd = sheet.evaluate(yieldLimit, { f_y, gamma_M0 });
  sheet.evaluate(vonMisesCriterion, { sigma_v_Ed, sigma_Rd });
  return {
    effect: side('sigma_v_Ed', sigma_v_Ed, 'N/mm^2'),
    resistance: side('sigma_Rd', sigma_Rd, 'N/mm^2'),
  };
}
