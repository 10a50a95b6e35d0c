import type { SectionEffects, SectionInput } from '../contract';
import {
  effectPointers,
  isEffectGiven,
  readEffects,
  writeEffects,
  type EffectsDraft,
} from '../effect-fields/effects-draft';
import type { FieldReader } from '../form/field-reader';
import { readMaterial, writeGrade, type AnyMaterial } from '../form/material';
import {
  isSectionGiven,
  readSectionDraft,
  sectionPointers,
  writeSectionDraft,
  type SectionDraft,
} from '../section-fields/section-draft';

/** A section of a steel under design effects, as it is typed. */
export interface UnderEffects {
  readonly section: SectionDraft;
  /** A grade, or `kept` for a material that is no grade of steel. */
  readonly grade: string;
  readonly effects: EffectsDraft;
}

interface Parts<Material extends AnyMaterial> {
  readonly material?: Material;
  readonly section?: SectionInput;
  readonly effects?: SectionEffects;
}

/** What a request says of its section, its steel and its effects, as the form shows it. */
export function writeUnderEffects(kept: Parts<AnyMaterial>): UnderEffects {
  return {
    section: writeSectionDraft(kept.section),
    grade: writeGrade(kept.material),
    effects: writeEffects(kept.effects),
  };
}

/** The same as a request says it, and what is not given yet, in words. */
export function readUnderEffects<Material extends AnyMaterial>(
  { section, grade, effects }: UnderEffects,
  kept: Material | undefined,
  reader: FieldReader,
) {
  const material = readMaterial(kept, grade);
  return {
    made: {
      material,
      section: readSectionDraft(section, reader),
      effects: readEffects(effects, reader),
    },
    wanting: [
      ...(isSectionGiven(section) ? [] : ['a section']),
      ...(material ? [] : ['a steel grade']),
      ...(isEffectGiven(effects) ? [] : ['a design effect']),
    ],
  };
}

/** The pointers of the fields that the form shows of them. */
export function pointersUnderEffects({ section, effects }: UnderEffects): string[] {
  return ['/material/grade', ...sectionPointers(section), ...effectPointers(effects)];
}
