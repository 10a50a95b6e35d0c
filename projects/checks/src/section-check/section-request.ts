import type { CheckKind, Draft } from '../check/check-session';
import type { SectionRequest } from '../contract';
import {
  effectPointers,
  isEffectGiven,
  readEffects,
  writeEffects,
  type EffectsDraft,
} from '../effect-fields/effects-draft';
import { FieldReader } from '../form/field-reader';
import { readMaterial, writeGrade } from '../form/material';
import { writeQuantity } from '../quantity/read-quantity';
import {
  isSectionGiven,
  readSectionDraft,
  sectionPointers,
  writeSectionDraft,
  type SectionDraft,
} from '../section-fields/section-draft';

/** The form of a cross-section as it is typed. */
export interface SectionCheckDraft extends Draft {
  /** What came from outside; what the form does not show stays in it. */
  readonly kept: Partial<SectionRequest>;
  readonly section: SectionDraft;
  /** A grade, or `kept` for a material that is no grade of steel. */
  readonly grade: string;
  readonly effects: EffectsDraft;
  readonly netArea: string;
  readonly vonMises: boolean;
}

/** How the form of a cross-section is written and read. */
export const sectionKind: CheckKind<SectionRequest, SectionCheckDraft> = {
  id: 'section',
  write: (request, profile) => {
    const kept: Partial<SectionRequest> = request ?? {};
    return {
      kept,
      profile: kept.profile ?? profile,
      section: writeSectionDraft(kept.section),
      grade: writeGrade(kept.material),
      effects: writeEffects(kept.effects),
      netArea: writeQuantity(kept.netArea),
      vonMises: kept.vonMises ?? false,
    };
  },
  read: (draft) => {
    const { kept, profile, section, grade, effects, netArea, vonMises } = draft;
    const reader = new FieldReader();
    const material = readMaterial(kept.material, grade);
    const made = {
      ...kept,
      profile: profile || undefined,
      material,
      section: readSectionDraft(section, reader),
      effects: readEffects(effects, reader),
      netArea:
        netArea === writeQuantity(kept.netArea)
          ? kept.netArea
          : reader.quantity('/netArea', netArea, 'mm^2'),
      vonMises: vonMises === (kept.vonMises ?? false) ? kept.vonMises : vonMises,
    };
    const wanting = [
      ...(isSectionGiven(section) ? [] : ['a section']),
      ...(material ? [] : ['a steel grade']),
      ...(isEffectGiven(effects) ? [] : ['a design effect']),
    ];
    return reader.reading(made, wanting);
  },
  shown: ({ section, effects }) => ({
    pointers: new Set([
      '/profile',
      '/material/grade',
      '/netArea',
      '/vonMises',
      ...sectionPointers(section),
      ...effectPointers(effects),
    ]),
    parts: { '/material': '/material/grade' },
  }),
};
