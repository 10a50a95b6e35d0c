import type { ProblemItem } from '../contract';
import { isEmptyRow, rowPointer, type WalerDraft } from './draft';
import type { FieldFault } from './read-draft';

/** What is wrong, sorted into what stands beside a field and what no field shows. */
export interface PlacedFaults {
  readonly beside: ReadonlyMap<string, FieldFault>;
  readonly rest: readonly FieldFault[];
}

/** Fields that the service names by their whole and the form shows by a part. */
const SHOWN_BY: Readonly<Record<string, string>> = {
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

/** Every field that the form shows as it stands, by its JSON pointer. */
export function shownPointers(draft: WalerDraft): Set<string> {
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
  return shown;
}

/** The fields of a row beside its name, nature and shape. */
function rowFields(shape: string): string[] {
  const always = ['name', 'nature'];
  if (shape === 'linear') return [...always, 'start', 'end', 'from', 'to'];
  if (shape === 'uniform') return [...always, 'value', 'from', 'to'];
  if (shape === 'area') return [...always, 'value', 'width', 'from', 'to'];
  return shape === 'thrust' ? [...always, 'value'] : [...always, 'value', 'at'];
}

/** Puts each fault beside the nearest field that shows what it points at. */
export function placeFaults(
  draft: WalerDraft,
  faults: readonly (FieldFault | ProblemItem)[],
): PlacedFaults {
  const shown = shownPointers(draft);
  const beside = new Map<string, FieldFault>();
  const rest: FieldFault[] = [];
  for (const fault of faults) {
    const place = nearest(fault.pointer, shown);
    const known = place === undefined ? undefined : beside.get(place);
    if (place === undefined || (known && known.message !== fault.message)) rest.push(fault);
    else beside.set(place, fault);
  }
  return { beside, rest };
}

function nearest(pointer: string, shown: ReadonlySet<string>): string | undefined {
  for (let at = pointer; at !== ''; at = at.slice(0, at.lastIndexOf('/'))) {
    if (shown.has(at)) return at;
    const part = SHOWN_BY[at] ?? `${at}/0`;
    if (shown.has(part)) return part;
  }
  return undefined;
}
