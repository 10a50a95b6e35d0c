import { WorkingSheet } from '../../formula/sheet';
import type { SolvedCase } from '../continuous/solve';
import type { Finding } from '../verification';

/** A combination under which the member cannot stand on supports that only push: it fails. */
export function mechanismOf(cases: readonly SolvedCase[], withSteps: boolean): Finding[] {
  const first = cases.find(({ state }) => state === null);
  if (!first) return [];
  const reason = `Under combination ${first.id} the loads lift the waler off its props: a mechanism.`;
  const sheet = new WorkingSheet('bending-y', withSteps);
  sheet.choose(() => ({
    symbol: 'mechanism',
    title: 'Supports that only push',
    because: reason,
    value: 'mechanism',
    clause: 'EN 1990 6.4.1(1)a',
  }));
  return [
    {
      id: 'bending-y',
      title: 'Equilibrium of the waler on its props',
      clause: 'EN 1990 6.4.1(1)a',
      effect: { symbol: 'M_y_Ed', value: 0, unit: 'kN m' },
      resistance: { symbol: 'M_c_y_Rd', value: 0, unit: 'kN m' },
      combination: first.id,
      place: null,
      sheet,
      reason,
    },
  ];
}
