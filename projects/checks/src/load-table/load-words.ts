import type { Option } from '../fields/choice-field';
import type { LoadShape } from '../form/draft';

/** What kinds of action there are. */
export const natures: readonly Option[] = [
  { value: 'permanent', label: 'permanent' },
  { value: 'variable', label: 'variable' },
  { value: 'accidental', label: 'accidental' },
];

/** How a load may act. */
export const shapes: readonly (Option & { value: LoadShape })[] = [
  { value: 'uniform', label: 'uniform' },
  { value: 'linear', label: 'linear' },
  { value: 'point', label: 'point' },
  { value: 'area', label: 'area × width' },
  { value: 'moment', label: 'moment' },
  { value: 'thrust', label: 'thrust, along' },
];

const CATEGORIES: readonly [string, string][] = [
  ['construction', 'construction'],
  ['surcharge', 'surcharge'],
  ['earth', 'earth'],
  ['water', 'water'],
  ['storage', 'storage'],
  ['wind', 'wind'],
  ['snow', 'snow'],
  ['temperature', 'temperature'],
  ['vehicles-light', 'light vehicles'],
  ['vehicles-heavy', 'heavy vehicles'],
  ['imposed-a', 'imposed, A'],
  ['imposed-b', 'imposed, B'],
  ['imposed-c', 'imposed, C'],
  ['imposed-d', 'imposed, D'],
];

/** The categories of variable actions; one that the form does not know stands as it is. */
export function categoryOptions(chosen: string): readonly Option[] {
  const known = CATEGORIES.map(([value, label]) => ({ value, label }));
  const own = chosen !== '' && !CATEGORIES.some(([value]) => value === chosen);
  return [
    { value: '', label: 'category …' },
    ...known,
    ...(own ? [{ value: chosen, label: chosen }] : []),
  ];
}
