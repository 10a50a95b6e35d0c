import { isEmptyRow, rowPointer, type WalerDraft } from './draft';
import type { ShownFields } from './place-faults';

/** Fields that the service names by their whole and the form shows by a part. */
const PARTS: Readonly<Record<string, string>> = {
  '/material': '/material/grade',
  '/overhangs': '/overhangs/start',
  '/bearing': '/bearing/length',
};

const SINGLE = [
  '/profile',
  '/section',
  '/material/grade',
  '/loadBasis',
  '/spans',
  '/overhangs/start',
  '/overhangs/end',
  '/restraint',
  '/bearing/length',
  '/bearing/endDistance',
  '/loadLevel',
  '/deflectionLimit',
  '/supports',
  '/supportStiffness',
  '/selfWeight',
  '/loads',
];

/** The fields behind the “more” disclosure, which opens when one of them is at fault. */
export const MORE = [
  '/overhangs',
  '/bearing/endDistance',
  '/supports',
  '/supportStiffness',
  '/selfWeight',
  '/loadBasis',
  '/loadLevel',
  '/waive',
];

/** What the form of a waler shows as it stands. */
export function shownOfWaler(draft: WalerDraft): ShownFields {
  const shown = new Set(SINGLE);
  if (draft.restraint === 'spacing') shown.add('/restraint/spacing');
  for (const row of draft.rows) {
    if (isEmptyRow(row)) continue;
    const pointer = rowPointer(draft.rows, row);
    shown.add(pointer);
    for (const field of rowFields(row.shape)) shown.add(`${pointer}/${field}`);
    if (row.nature === 'variable') shown.add(`${pointer}/category`);
  }
  draft.waivers.forEach((_, index) => {
    shown.add(`/waive/${index}/verification`).add(`/waive/${index}/reason`);
  });
  return { pointers: shown, parts: PARTS };
}

/** The fields of a row beside its name, nature and shape. */
function rowFields(shape: string): string[] {
  const always = ['name', 'nature'];
  if (shape === 'linear') return [...always, 'start', 'end', 'from', 'to'];
  if (shape === 'uniform') return [...always, 'value', 'from', 'to'];
  if (shape === 'area') return [...always, 'value', 'width', 'from', 'to'];
  return shape === 'thrust' ? [...always, 'value'] : [...always, 'value', 'at'];
}
