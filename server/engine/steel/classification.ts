import { formula } from '../formula/formula';
import type { Sheet } from '../formula/sheet';
import type { ISectionDimensions } from '../sections/i-section';

export type SectionClass = 1 | 2 | 3 | 4;

const TABLE = 'EN 1993-1-1 Table 5.2';

export const epsilonFactor = formula({
  symbol: 'epsilon',
  title: 'Strength factor of the width-to-thickness limits',
  unit: '1',
  clause: TABLE,
  expression: 'sqrt((235 N/mm^2) / f_y)',
  where: { f_y: 'N/mm^2' },
});

export const flangeSlenderness = formula({
  symbol: 'c_f_t_f',
  title: 'Width to thickness of the flange outstand',
  unit: '1',
  clause: `${TABLE} sheet 2`,
  expression: '(b - t_w - 2 * r) / 2 / t_f',
  where: { b: 'mm', t_w: 'mm', r: 'mm', t_f: 'mm' },
});

export const webSlenderness = formula({
  symbol: 'c_w_t_w',
  title: 'Depth to thickness of the web between fillets',
  unit: '1',
  clause: `${TABLE} sheet 1`,
  expression: '(h - 2 * t_f - 2 * r) / t_w',
  where: { h: 'mm', t_f: 'mm', r: 'mm', t_w: 'mm' },
});

/**
 * Limits of c/t over epsilon for classes 1, 2 and 3. Confirmed by published examples that were
 * read: 9 and 72 (CL-01, MSB04 App. A.1), 10 (CL-03, UBP 356x368x174 is class 2). From memory,
 * unconfirmed: 14, 83 and 124.
 */
const outstandInCompression = [9, 10, 14] as const;
const webInBending = [72, 83, 124] as const;

function classOf(slenderness: number, epsilon: number, limits: readonly number[]): SectionClass {
  const passed = limits.findIndex((limit) => slenderness <= limit * epsilon);
  return (passed === -1 ? 4 : passed + 1) as SectionClass;
}

/**
 * Class of an I or H section in bending without axial force: the worst of flange and web.
 * A flange outstand counts as uniformly compressed, which is the safe end for bending about z-z.
 */
export function classifyIBending(
  dimensions: ISectionDimensions,
  f_y: number,
  sheet: Sheet,
): SectionClass {
  const { h, b, t_w, t_f, r } = dimensions;
  const epsilon = sheet.evaluate(epsilonFactor, { f_y });
  const flangeRatio = sheet.evaluate(flangeSlenderness, { b, t_w, r, t_f });
  const webRatio = sheet.evaluate(webSlenderness, { h, t_f, r, t_w });
  const flange = classOf(flangeRatio, epsilon, outstandInCompression);
  const web = classOf(webRatio, epsilon, webInBending);
  const result = Math.max(flange, web) as SectionClass;
  sheet.choose(() => ({
    symbol: 'section_class',
    title: 'Class of the cross-section',
    because: `flange class ${flange}, web class ${web} in bending; the greater counts`,
    value: result,
    clause: 'EN 1993-1-1 5.5.2(6)',
  }));
  return result;
}
