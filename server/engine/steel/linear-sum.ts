import { formula, type Formula } from '../formula/formula';
import type { UnitName } from '../units/units';

/** Effects that may stand in a sum of ratios, with the unit of each. */
const units = { N: 'kN', M_y: 'kN m', M_z: 'kN m', B: 'kN m^2' } as const satisfies Record<
  string,
  UnitName
>;

export type SumTerm = keyof typeof units;

/** By what a sum's resistances are: plastic, elastic, of effective sections, or elastic with warping. */
export type SumKind = 'plastic' | 'elastic' | 'effective' | 'warped';

const headings: Readonly<Record<SumKind, { readonly title: string; readonly clause: string }>> = {
  plastic: {
    title: 'Sum of the ratios, plastic resistances',
    clause: 'EN 1993-1-1 6.2.1(7) (6.2)',
  },
  elastic: {
    title: 'Sum of the ratios, elastic: stress along the member over f_y',
    clause: 'EN 1993-1-1 6.2.9.2(1) (6.42)',
  },
  effective: {
    title: 'Sum of the ratios, effective section',
    clause: 'EN 1993-1-1 6.2.9.3(2) (6.44)',
  },
  warped: {
    title: 'Sum of the ratios with the bimoment',
    clause: 'EN 1993-1-1 6.2.7(5) and 6.2.1(7)',
  },
};

const order: readonly SumTerm[] = ['N', 'M_y', 'M_z', 'B'];

const nameOf = (kind: SumKind, terms: readonly SumTerm[]): string => [kind, ...terms].join(' ');

/** Every set of effects that may act, so that a sum prints what acts and nothing else. */
function subsets(terms: readonly SumTerm[]): SumTerm[][] {
  return terms.reduce<SumTerm[][]>(
    (sets, term) => [...sets, ...sets.map((set) => [...set, term])],
    [[]],
  );
}

function sumOf(kind: SumKind, terms: readonly SumTerm[]): Formula {
  const symbols = terms.flatMap((term): [string, UnitName][] => [
    [`${term}_Ed`, units[term]],
    [`${term}_Rd`, units[term]],
  ]);
  return formula({
    symbol: 'utilisation',
    ...headings[kind],
    unit: '1',
    expression: terms.map((term) => `${term}_Ed / ${term}_Rd`).join(' + '),
    where: Object.fromEntries(symbols),
  });
}

const sums = new Map<string, Formula>();
for (const terms of subsets(order).filter(({ length }) => length > 0)) {
  const kinds: readonly SumKind[] = terms.includes('B')
    ? ['warped']
    : ['plastic', 'elastic', 'effective'];
  for (const kind of kinds) sums.set(nameOf(kind, terms), sumOf(kind, terms));
}

/** The sum over the effects that act; with a bimoment it is `warped`. */
export function linearSum(kind: SumKind, acting: readonly SumTerm[]): Formula {
  const found = sums.get(
    nameOf(
      kind,
      order.filter((term) => acting.includes(term)),
    ),
  );
  if (!found) throw new Error(`There is no ${kind} sum over ${acting.join(', ')}.`);
  return found;
}

/** Clause of a sum of ratios. */
export function clauseOfSum(kind: SumKind): string {
  return headings[kind].clause;
}
