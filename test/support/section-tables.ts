import { readFileSync } from 'node:fs';
import { join } from 'node:path';

export type TableRow = Readonly<Record<string, string>>;

const folder = join(__dirname, '../published/sections');

/** The rows of a published table of sections, by the names of its columns. */
export function readTable(name: string): TableRow[] {
  const text = readFileSync(join(folder, `${name}.csv`), 'utf8');
  const [header = '', ...lines] = text.trim().split('\n');
  const columns = header.split(',');
  return lines.map((line) => {
    const cells = [...line.matchAll(/("[^"]*"|[^,]*)(?:,|$)/g)].map((match) =>
      (match[1] ?? '').replaceAll('"', ''),
    );
    return Object.fromEntries(columns.map((column, index) => [column, cells[index] ?? '']));
  });
}

/** A column as a number; NaN where the cell is empty. */
export function numberIn(row: TableRow, column: string): number {
  const text = row[column] ?? '';
  return text === '' ? NaN : Number(text);
}

/** Half a unit of the last printed digit: what the table itself leaves open. */
function halfLastDigit(printed: string): number {
  return 0.5 * 10 ** -(printed.split('.')[1] ?? '').length;
}

/** Notes that say nothing against a row's values: a mass, a range, another source left aside. */
const harmless = /mass|mill range|properties not taken|identical dimensions/;

/** Whether a row's note speaks against its value in a column. */
function doubted(flags: string, column: string): boolean {
  return flags.split('; ').some((flag) => {
    const [, columns] = /value off by .*: (.+)$/.exec(flag) ?? [];
    if (columns !== undefined) return columns.split(',').includes(column);
    return flag !== '' && !harmless.test(flag);
  });
}

/**
 * Greatest |computed / tabulated - 1| of a column over the table's undoubted values, beyond what the
 * printed digits leave open, in per cent; and how many values were compared.
 */
export function worstOf(
  name: string,
  column: string,
  computed: (row: TableRow) => number,
): { readonly percent: number; readonly count: number } {
  let worst = 0;
  let count = 0;
  for (const row of readTable(name)) {
    const printed = numberIn(row, column);
    if (!(printed > 0) || doubted(row.flags ?? '', column)) continue;
    const deviation = Math.abs(computed(row) / printed - 1);
    worst = Math.max(worst, deviation - halfLastDigit(row[column] ?? '') / printed);
    count += 1;
  }
  return { percent: 100 * worst, count };
}
