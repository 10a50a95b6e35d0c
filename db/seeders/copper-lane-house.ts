import type { Departure } from '../../server/engine/profiles/profile';
import { publishedProfiles } from '../../server/engine/profiles/published';
import { findValue, isProfileValue } from '../../server/engine/profiles/reader';
import type { ProfileTree } from '../../server/engine/profiles/tree';
import type { ApprovedContent } from '../revise';

export const COPPER_LANE_HOUSE = 'copper-lane-house';

interface Difference {
  readonly path: string;
  readonly to: number;
  readonly clause: string;
  readonly source: string;
  readonly locator?: string;
  readonly reason: string;
}

const steelMinimum = {
  to: 1.1,
  clause: 'BS 5975:2019 13.3.9',
  source: 'BS 5975:2019 (extract)',
  locator: 'p.62',
  reason:
    'BS 5975:2019 13.3.9 asks at least 1.10 on the resistance of steel temporary works; ' +
    'the National Annex value is for permanent works.',
};
const steel: Difference[] = ['steel.gamma_M0', 'steel.gamma_M1'].map((path) => ({
  path,
  ...steelMinimum,
}));
const thermal: Difference = {
  path: 'psi.temperature.psi_0',
  to: 1,
  clause: 'Firm rule',
  source: 'Saltmarsh Temporary Works, design note for the Copper Lane basement (invented)',
  reason:
    'The props are closely restrained and in full sun: the thermal load is taken whole ' +
    'beside a leading surcharge.',
};

/** The firm's revisions, oldest first; both start from the UK set and only ask for more. */
export function copperLaneHouse(): ApprovedContent[] {
  const uk = publishedProfiles.find(({ slug }) => slug === 'uk-na');
  if (!uk) throw new Error('The published profiles have no uk-na to depart from.');
  return [steel, [...steel, thermal]].map((differences) => ({
    slug: COPPER_LANE_HOUSE,
    title: 'Copper Lane basement, house rules',
    owner: 'Saltmarsh Temporary Works',
    ...depart(uk.tree, differences),
  }));
}

/** The tree with each difference put in as a firm's value, and what was departed from. */
function depart(
  start: ProfileTree,
  differences: readonly Difference[],
): { tree: ProfileTree; departures: Departure[] } {
  let tree = start;
  const departures: Departure[] = [];
  for (const [index, difference] of differences.entries()) {
    const { path, to, clause, source, locator, reason } = difference;
    const replaced = findValue(start, path);
    if (!replaced) throw new Error(`The published tree has no ${path} to depart from.`);
    const note = { kind: 'firm' as const, note: reason };
    const value = { value: to, unit: replaced.unit, clause, source, ...note };
    tree = put(tree, path.split('.'), locator === undefined ? value : { ...value, locator });
    departures.push({ id: `D${index + 1}`, path, from: replaced.value, to, reason });
  }
  return { tree, departures };
}

function put(tree: ProfileTree, path: readonly string[], value: ProfileTree[string]): ProfileTree {
  const [name = '', ...rest] = path;
  const branch = tree[name];
  if (rest.length === 0) return { ...tree, [name]: value };
  if (branch === undefined || isProfileValue(branch)) throw new Error(`${name} is no branch.`);
  return { ...tree, [name]: put(branch, rest, value) };
}
