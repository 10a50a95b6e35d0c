import type { ProfileValue } from '../profiles/tree';

/** f_y and f_u of a grade up to a thickness, in N/mm². */
export interface StrengthRow {
  /** Greatest nominal thickness of the row in mm. */
  readonly upTo: number;
  readonly fy: ProfileValue<number>;
  readonly fu: ProfileValue<number>;
}

export type StrengthTable = 'table-3.1' | 'product-standards';

const MEMORY = 'from memory, unconfirmed';

function strength(value: number, clause: string, confirmedBy?: string): ProfileValue<number> {
  const base = { value, unit: 'N/mm^2', clause, source: MEMORY, kind: 'recalled' } as const;
  return confirmedBy === undefined ? base : { ...base, confirmedBy };
}

function rows(
  clause: string,
  ...list: [upTo: number, fy: number, fu: number, confirmed?: string][]
): StrengthRow[] {
  return list.map(([upTo, fy, fu, confirmed]) => ({
    upTo,
    fy: strength(fy, clause, confirmed),
    fu: strength(fu, clause),
  }));
}

const T31 = 'EN 1993-1-1 Table 3.1';
const P2 = 'EN 10025-2 Table 6';
const P4 = 'EN 10025-4 Table 4';

const EXAMPLES = {
  s235: 'RB-01, CO-01: f_y 235 for IPE 330 and HE 300 B (MSB04 App. A)',
  s275: 'CL-06: f_y 275 for HE 160 B (solved exercise 03.4)',
  s355: 'RB-03, RB-04: f_y 355 for IPE 450 (SSB04 App. D)',
  s275over16: 'LT-07: f_y 265 for UB 610x229x125, t_f 19.6 mm (Steel Designers’ Manual)',
  s355over16: 'CL-03: f_y 345 for UBP 356x368x174, t_f 20.4 mm (UK NA resistance tables)',
};

/**
 * Nominal strengths, from memory; where a published example that was read uses the value, it is
 * named. Table 3.1 as amended by A1:2014.
 */
export const steelStrengths: Readonly<
  Record<StrengthTable, Readonly<Record<string, readonly StrengthRow[]>>>
> = {
  'table-3.1': {
    S235: rows(T31, [40, 235, 360, EXAMPLES.s235], [80, 215, 360]),
    S275: rows(T31, [40, 275, 430, EXAMPLES.s275], [80, 255, 410]),
    S355: rows(T31, [40, 355, 490, EXAMPLES.s355], [80, 335, 470]),
    S450: rows(T31, [40, 440, 550], [80, 410, 550]),
    S460: rows(T31, [40, 460, 540], [80, 430, 530]),
  },
  'product-standards': {
    S235: rows(P2, [16, 235, 360, EXAMPLES.s235], [40, 225, 360], [80, 215, 360], [100, 215, 360]),
    S275: rows(
      P2,
      [16, 275, 410, EXAMPLES.s275],
      [40, 265, 410, EXAMPLES.s275over16],
      [63, 255, 410],
      [80, 245, 410],
      [100, 235, 410],
    ),
    S355: rows(
      P2,
      [16, 355, 470, EXAMPLES.s355],
      [40, 345, 470, EXAMPLES.s355over16],
      [63, 335, 470],
      [80, 325, 470],
      [100, 315, 470],
    ),
    S450: rows(P2, [16, 450, 550], [40, 430, 550], [63, 410, 550], [80, 390, 550], [100, 380, 550]),
    S460: rows(P4, [16, 460, 540], [40, 440, 540], [63, 430, 530], [80, 410, 510], [100, 400, 500]),
  },
};
