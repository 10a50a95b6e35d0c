import type { CheckKind, Draft } from '../check/check-session';
import type { StressRequest } from '../contract';
import {
  effectPointers,
  isEffectGiven,
  readEffects,
  writeEffects,
  type EffectsDraft,
} from '../effect-fields/effects-draft';
import { FieldReader } from '../form/field-reader';
import { readMaterial, writeGrade } from '../form/material';
import {
  isSectionGiven,
  readSectionDraft,
  sectionPointers,
  writeSectionDraft,
  type SectionDraft,
} from '../section-fields/section-draft';
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
export interface StressDraft extends Draft {
  /** What came from outside. */
  readonly kept: Partial<StressRequest>;
  readonly way: StressWay;
  /** A grade, or `kept` for a material that is no grade of steel. */
  readonly grade: string;
  readonly section: SectionDraft;
  readonly effects: EffectsDraft;
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
      grade: writeGrade(kept.material),
      section: writeSectionDraft(kept.section),
      effects: writeEffects(kept.effects),
      states: states.length > 0 ? states : [stateRow()],
    };
  },
  read: (draft) => {
    const { profile, way, section, effects, states } = draft;
    const reader = new FieldReader();
    const material = readMaterial(draft.kept.material, draft.grade);
    const bySection = way === 'section';
    const made = {
      profile: profile || undefined,
      material,
      ...(bySection
        ? { section: readSectionDraft(section, reader), effects: readEffects(effects, reader) }
        : { states: readStates(states, reader) }),
    };
    const wanting = bySection
      ? [
          ...(isSectionGiven(section) ? [] : ['a section']),
          ...(material ? [] : ['a steel grade']),
          ...(isEffectGiven(effects) ? [] : ['a design effect']),
        ]
      : [
          ...(material ? [] : ['a steel grade']),
          ...(states.every(isEmptyState) ? ['a state of stress'] : []),
        ];
    return reader.reading(made, wanting);
  },
  shown: ({ way, section, effects, states }) => ({
    pointers: new Set([
      '/profile',
      '/material/grade',
      ...(way === 'section'
        ? [...sectionPointers(section), ...effectPointers(effects)]
        : ['/states', ...states.flatMap((row) => rowPointers(states, row))]),
    ]),
    parts: { '/material': '/material/grade' },
  }),
};

function rowPointers(rows: readonly StateRow[], row: StateRow): string[] {
  if (isEmptyState(row)) return [];
  const pointer = statePointer(rows, row);
  return [pointer, ...stressComponents.map((name) => `${pointer}/${name}`)];
}
