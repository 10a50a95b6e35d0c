import type { AxialLoad, Load, QuantityInput } from '../contract';
import type { FieldUnit } from '../quantity/units';
import { isEmptyRow, rowPointer, type LoadRow, type LoadShape } from './draft';
import type { FieldReader } from './field-reader';
import { writeDraft } from './write-draft';

/** The unit of a load's value. */
export const shapeUnit: Readonly<Record<LoadShape, FieldUnit>> = {
  uniform: 'kN/m',
  linear: 'kN/m',
  point: 'kN',
  area: 'kN/m^2',
  moment: 'kN m',
  thrust: 'kN',
};

/** The fields that the table writes; whatever else a load holds is kept. */
const WRITTEN = [
  'name',
  'nature',
  'category',
  'kind',
  'value',
  'start',
  'end',
  'width',
  'from',
  'to',
  'at',
];

/** Reads the table; rows with nothing in them are left out. */
export function readRows(rows: readonly LoadRow[], reader: FieldReader) {
  const loads: Load[] = [];
  const thrust: AxialLoad[] = [];
  for (const row of rows) {
    if (isEmptyRow(row)) continue;
    const pointer = rowPointer(rows, row);
    const made = unchanged(row) ? row.kept : readRow(row, pointer, reader);
    if (row.shape === 'thrust') thrust.push(made as AxialLoad);
    else loads.push(made as Load);
  }
  return { loads, thrust };
}

/** Whether the row says just what the load it came from says. */
function unchanged(row: LoadRow): boolean {
  if (!row.kept) return false;
  const request = 'kind' in row.kept ? { loads: [row.kept] } : { thrust: [row.kept] };
  const [shown] = writeDraft(request).rows;
  const texts = (one: LoadRow) => JSON.stringify({ ...one, id: 0, kept: null });
  return shown !== undefined && texts(shown) === texts(row);
}

function readRow(row: LoadRow, pointer: string, reader: FieldReader): object {
  const { name, nature, category, shape } = row;
  if (name.trim() === '') reader.fault(`${pointer}/name`, 'Name the source, such as earth.');
  if (nature === 'variable' && category === '') {
    reader.fault(`${pointer}/category`, 'Choose the category.');
  }
  const needed = (field: string, text: string, unit: FieldUnit) =>
    reader.needed(`${pointer}/${field}`, text, unit);
  const extent: Record<string, QuantityInput | undefined> = {
    from: reader.quantity(`${pointer}/from`, shape in LONG ? row.from : '', 'm'),
    to: reader.quantity(`${pointer}/to`, shape in LONG ? row.to : '', 'm'),
  };
  const unit = shapeUnit[shape];
  const own: Record<string, unknown> =
    shape === 'linear'
      ? { start: needed('start', row.value, unit), end: needed('end', row.end, unit), ...extent }
      : { value: needed('value', row.value, unit), ...extent };
  if (shape === 'area') own.width = needed('width', row.width, 'm');
  if (shape === 'point' || shape === 'moment') own.at = needed('at', row.at, 'm');
  const made = {
    name: name.trim(),
    nature,
    category: nature === 'variable' ? category : undefined,
    kind: shape === 'thrust' ? undefined : shape,
    ...own,
    ...beyondTheTable(row),
  };
  return Object.fromEntries(Object.entries(made).filter(([, value]) => value !== undefined));
}

const LONG = { uniform: true, linear: true, area: true };

function beyondTheTable({ kept }: LoadRow): object {
  return Object.fromEntries(Object.entries(kept ?? {}).filter(([name]) => !WRITTEN.includes(name)));
}
