import type { CheckKind, Draft } from '../check/check-session';
import type { SectionRequest } from '../contract';
import { FieldReader } from '../form/field-reader';
import { writeQuantity } from '../quantity/read-quantity';
import {
  pointersUnderEffects,
  readUnderEffects,
  writeUnderEffects,
  type UnderEffects,
} from '../section-form/under-effects';

/** The form of a cross-section as it is typed. */
export interface SectionCheckDraft extends Draft, UnderEffects {
  /** What came from outside; what the form does not show stays in it. */
  readonly kept: Partial<SectionRequest>;
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
      ...writeUnderEffects(kept),
      netArea: writeQuantity(kept.netArea),
      vonMises: kept.vonMises ?? false,
    };
  },
  read: (draft) => {
    const { kept, profile, netArea, vonMises } = draft;
    const reader = new FieldReader();
    const { made, wanting } = readUnderEffects(draft, kept.material, reader);
    const all = {
      ...kept,
      profile: profile || undefined,
      ...made,
      netArea:
        netArea === writeQuantity(kept.netArea)
          ? kept.netArea
          : reader.quantity('/netArea', netArea, 'mm^2'),
      vonMises: vonMises === (kept.vonMises ?? false) ? kept.vonMises : vonMises,
    };
    return reader.reading(all, wanting);
  },
  shown: (draft) => ({
    pointers: new Set(['/profile', '/netArea', '/vonMises', ...pointersUnderEffects(draft)]),
    parts: { '/material': '/material/grade' },
  }),
};
