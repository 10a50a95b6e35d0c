import type { Action, Nature } from '../../actions/action';
import { MOST_ACTIONS } from '../../actions/combinations';
import type { BeamLoad } from '../../analysis/beam.types';
import { fromUnit } from '../../units/units';
import { readQuantity } from '../../units/quantity';
import type { ProfileReader } from '../../profiles/reader';
import type { LoadInput } from '../contract';
import { refuse } from '../refuse';
import { bySense } from './arrangements';
import { memberEnds, type SupportLayout } from './geometry';

/** Name of the action that self-weight is; a caller's load may not take it. */
export const SELF_WEIGHT = 'self-weight';

/** One action with its loads, those that come span by span apart from those that come whole. */
export interface ActionLoads {
  readonly action: Action;
  readonly bySpan: readonly BeamLoad[];
  readonly whole: readonly BeamLoad[];
}

/** Loads given past the member by less than this (mm) are taken to its end. */
const ROUNDING = 1e-6;

/**
 * The loads of one set, gathered by name: the same name is one source with one factor.
 *
 * @param pointer to the list in the request
 * @param patterned whether variable loads may be absent span by span
 */
export function readActions(
  loads: readonly LoadInput[],
  layout: SupportLayout,
  pointer: string,
  patterned: boolean,
  profile: ProfileReader,
): ActionLoads[] {
  const byName = new Map<string, { action: Action; bySpan: BeamLoad[]; whole: BeamLoad[] }>();
  loads.forEach((load, index) => {
    const here = `${pointer}/${index}`;
    const action = actionOf(load, here);
    knownCategory(action, here, profile);
    const known = byName.get(load.name);
    if (known) sameSource(known.action, action, here);
    const entry = known ?? { action, bySpan: [], whole: [] };
    byName.set(load.name, entry);
    const spanBySpan = load.nature === 'variable' && patterned && load.patternLoading !== false;
    const made = beamLoad(load, layout, here);
    if (spanBySpan) entry.bySpan.push(...bySense(made));
    else entry.whole.push(made);
  });
  const actions = [...byName.values()];
  countNames(actions, pointer);
  return actions;
}

function actionOf({ name, nature, category }: LoadInput, pointer: string): Action {
  if (name.trim().toLowerCase() === SELF_WEIGHT) {
    refuse(
      'reserved-name',
      `${pointer}/name`,
      `"${SELF_WEIGHT}" is the name of the member's own weight.`,
    );
  }
  return category === undefined ? { name, nature } : { name, nature, category };
}

/** A category that the profile does not have is a slip, whether or not its psi would be read. */
function knownCategory({ category }: Action, pointer: string, profile: ProfileReader): void {
  if (category === undefined || profile.has(`psi.${category}.psi_0`)) return;
  const known = Object.keys(profile.revision.tree.psi ?? {}).join(', ');
  refuse(
    'unknown-category',
    `${pointer}/category`,
    `The profile knows no category "${category}"; it knows ${known}.`,
    'EN 1990 Table A1.1',
  );
}

function sameSource(known: Action, action: Action, pointer: string): void {
  for (const field of ['nature', 'category'] as const) {
    if (known[field] === action[field]) continue;
    refuse(
      'one-source-two-kinds',
      `${pointer}/${field}`,
      `"${action.name}" is one source of load and has the ${field} "${known[field] ?? 'none'}" elsewhere.`,
    );
  }
}

function countNames(actions: readonly ActionLoads[], pointer: string): void {
  for (const nature of ['permanent', 'variable'] satisfies Nature[]) {
    const count = actions.filter(({ action }) => action.nature === nature).length;
    if (count > MOST_ACTIONS) {
      refuse(
        'too-many',
        pointer,
        `${count} ${nature} sources are named; ${MOST_ACTIONS} is the most.`,
      );
    }
  }
}

function beamLoad(load: LoadInput, layout: SupportLayout, pointer: string): BeamLoad {
  const ends = memberEnds(layout);
  if (load.kind === 'point' || load.kind === 'moment') {
    const at = inside(readQuantity(load.at, 'm'), ends, `${pointer}/at`);
    const unit = load.kind === 'point' ? 'kN' : 'kN m';
    return { kind: load.kind, at, value: readQuantity(load.value, unit) };
  }
  const from =
    load.from === undefined
      ? ends.start
      : inside(readQuantity(load.from, 'm'), ends, `${pointer}/from`);
  const to =
    load.to === undefined ? ends.end : inside(readQuantity(load.to, 'm'), ends, `${pointer}/to`);
  if (to - from <= ROUNDING) {
    refuse('no-length', `${pointer}/to`, 'The load ends where it begins, or before.');
  }
  return { kind: 'distributed', from, to, ...intensities(load) };
}

function intensities(load: Exclude<LoadInput, { kind: 'point' | 'moment' }>): {
  start: number;
  end: number;
} {
  if (load.kind === 'linear') {
    return { start: readQuantity(load.start, 'kN/m'), end: readQuantity(load.end, 'kN/m') };
  }
  const value =
    load.kind === 'area'
      ? readQuantity(load.value, 'kN/m^2') * readQuantity(load.width, 'm')
      : readQuantity(load.value, 'kN/m');
  return { start: value, end: value };
}

function inside(x: number, ends: { start: number; end: number }, pointer: string): number {
  if (x < ends.start - ROUNDING || x > ends.end + ROUNDING) {
    const [start, end] = [ends.start / fromUnit(1, 'm'), ends.end / fromUnit(1, 'm')];
    refuse('outside-member', pointer, `The member runs from ${start} to ${end} m.`);
  }
  return Math.min(Math.max(x, ends.start), ends.end);
}
