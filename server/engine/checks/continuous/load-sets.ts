import type { Action, Combination, Situation } from '../../actions/action';
import { combine, uncombined } from '../../actions/combinations';
import type { ProfileReader } from '../../profiles/reader';
import type { WalerRequest } from '../contract';
import { refuse } from '../refuse';
import type { SupportLayout } from './geometry';
import { readActions, type ActionLoads } from './loads';

/** A set of loads with the combinations that are made of it. */
export interface LoadCaseSet {
  /** The caller's name of it; null for the single list of loads. */
  readonly id: string | null;
  readonly actions: readonly ActionLoads[];
  readonly combinations: readonly Combination[];
}

type LoadsInput = Pick<WalerRequest, 'loadBasis' | 'loads' | 'loadSets' | 'patternLoading'>;

/**
 * Every set of the request with its combinations, strength and serviceability.
 *
 * @param added actions of the service itself, such as self-weight across the loads' plane
 */
export function readLoadSets(
  request: LoadsInput,
  layout: SupportLayout,
  profile: ProfileReader,
  added: readonly Action[],
): LoadCaseSet[] {
  const patterned = request.patternLoading !== false;
  if (!request.loads) return readSets(request, layout, profile, patterned, added);
  const actions = readActions(request.loads, layout, '/loads', patterned, profile);
  if (actions.length === 0) refuse('empty', '/loads', 'No load is given.');
  const design = request.loadBasis === 'design';
  const make = design ? uncombined : combine;
  const list = [...actions.map(({ action }) => action), ...added];
  const combinations = situationsOf(actions, design).flatMap((one) => make(list, one, profile));
  return [{ id: null, actions, combinations }];
}

function readSets(
  request: LoadsInput,
  layout: SupportLayout,
  profile: ProfileReader,
  patterned: boolean,
  added: readonly Action[],
): LoadCaseSet[] {
  const sets = request.loadSets ?? [];
  refuseNeverFactored(request, sets);
  const ids = new Set<string>();
  const verifiesService = sets.some(({ situation }) => situation === 'serviceability');
  return sets.map((set, index) => {
    const pointer = `/loadSets/${index}`;
    if (ids.has(set.id))
      refuse('duplicate', `${pointer}/id`, `Two load sets are called "${set.id}".`);
    ids.add(set.id);
    const factored = set.combination === 'A1';
    if (factored && request.loadBasis === 'design') {
      refuse(
        'factored-twice',
        `${pointer}/combination`,
        'Design values already hold their factors; the combination of such a set is "none".',
        'EN 1990 6.3.1',
      );
    }
    const actions = readActions(set.loads, layout, `${pointer}/loads`, patterned, profile);
    const accidental = actions.some(({ action }) => action.nature === 'accidental');
    if (factored && accidental !== (set.situation === 'accidental')) {
      refuse(
        'situation-mismatch',
        `${pointer}/situation`,
        'An accidental load needs the accidental situation, and that situation an accidental load.',
        'EN 1990 6.4.3.3',
      );
    }
    const make = factored ? combine : uncombined;
    // A persistent set of characteristic values serves deflection too, unless a set was given for it.
    const alsoService = factored && set.situation === 'persistent' && !verifiesService;
    const situations: Situation[] = alsoService
      ? ['persistent', 'serviceability']
      : [set.situation];
    const list = [...actions.map(({ action }) => action), ...added];
    const combinations = situations.flatMap((one) => make(list, one, profile));
    return { id: set.id, actions, combinations };
  });
}

/** Design values say nothing of serviceability: their deflection needs a set of its own. */
function situationsOf(actions: readonly ActionLoads[], design: boolean): Situation[] {
  const accidental = actions.some(({ action }) => action.nature === 'accidental');
  if (design) return [accidental ? 'accidental' : 'persistent'];
  return accidental
    ? ['persistent', 'accidental', 'serviceability']
    : ['persistent', 'serviceability'];
}

/** Characteristic values that nothing ever factors are no strength verification. */
function refuseNeverFactored(
  { loadBasis }: LoadsInput,
  sets: readonly { situation: Situation; combination: 'A1' | 'none' }[],
): void {
  if (loadBasis === 'design') return;
  const persistent = sets.filter(({ situation }) => situation === 'persistent');
  if (persistent.length === 0 || persistent.some(({ combination }) => combination === 'A1')) return;
  refuse(
    'never-factored',
    '/loadSets',
    'Characteristic values that no set factors ("A1") are no strength verification; values that hold their factors are "loadBasis": "design".',
    'EN 1990 6.3.1',
  );
}
