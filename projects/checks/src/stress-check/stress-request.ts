import type { CheckKind, Draft } from '../check/check-session';
import type { StressRequest } from '../contract';
import { FieldReader } from '../form/field-reader';
import { readMaterial } from '../form/material';
import {
  pointersUnderEffects,
  readUnderEffects,
  writeUnderEffects,
  type UnderEffects,
} from '../section-form/under-effects';
import {
  isEmptyState,
  readStates,
  statePointer,
  stateRow,
  stressComponents,
  type StateRow,
} from '../state-table/states-draft';

/** From what the stresses come: they are given, or they are those of a section under effects. */
export type StressWay = 'section' | 'states';

/** The form of a stress check as it is typed. */
export interface StressDraft extends Draft, UnderEffects {
  /** What came from outside. */
  readonly kept: Partial<StressRequest>;
  readonly way: StressWay;
  readonly states: readonly StateRow[];
}

/** How the form of a stress check is written and read. */
export const stressKind: CheckKind<StressRequest, StressDraft> = {
  id: 'stress',
  write: (request, profile) => {
    const kept: Partial<StressRequest> = request ?? {};
    const states = (kept.states ?? []).map((state) => stateRow(state));
    return {
      kept,
      profile: kept.profile ?? profile,
      way: kept.states ? 'states' : 'section',
      ...writeUnderEffects(kept),
      states: states.length > 0 ? states : [stateRow()],
    };
  },
  read: (draft) => {
    const { kept, profile, way, states } = draft;
    const reader = new FieldReader();
    if (way === 'section') {
      const { made, wanting } = readUnderEffects(draft, kept.material, reader);
      return reader.reading({ profile: profile || undefined, ...made }, wanting);
    }
    const material = readMaterial(kept.material, draft.grade);
    const wanting = [
      ...(material ? [] : ['a steel grade']),
      ...(states.every(isEmptyState) ? ['a state of stress'] : []),
    ];
    const made = { profile: profile || undefined, material, states: readStates(states, reader) };
    return reader.reading(made, wanting);
  },
  shown: (draft) => {
    const { way, states } = draft;
    const own =
      way === 'section'
        ? pointersUnderEffects(draft)
        : ['/material/grade', '/states', ...states.flatMap((row) => rowPointers(states, row))];
    return {
      pointers: new Set(['/profile', ...own]),
      parts: { '/material': '/material/grade' },
    };
  },
};

function rowPointers(rows: readonly StateRow[], row: StateRow): string[] {
  if (isEmptyState(row)) return [];
  const pointer = statePointer(rows, row);
  return [pointer, ...stressComponents.map((name) => `${pointer}/${name}`)];
}
