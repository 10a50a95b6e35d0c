import { Refusal } from '../refusal';
import type { ProfileReader } from '../profiles/reader';
import { steelStrengths, type StrengthTable } from './steel-strengths';

/** N/mm²; EN 1993-1-1 3.1(2) goes up to S460, EN 1993-1-12 beyond. */
export const HIGHEST_STRENGTH = 460;

/** EN 1993-1-1 3.2.6; E confirmed by the N_cr of CO-01 (MSB04 App. A.5), G by the contract. */
export const STEEL_E = 210_000;
export const STEEL_G = 81_000;

/** Density for self-weight where no mass is published, EN 10365: 7850 kg/m³, in kg/mm³. */
export const STEEL_DENSITY = 7.85e-6;

/** m/s²; RB-01 (MSB04 App. A.1) takes 0.482 kN/m for the 49.1 kg/m of IPE 330. */
export const GRAVITY = 9.81;

/** Quality and delivery that EN 10025, EN 10210 and EN 10219 put behind the strength class. */
const gradeName = /^S ?(\d{3}) ?(JR|J0|J2|K2|NL|N|ML|M)?H?W?(?: ?\+(?:AR|N|M))?$/i;

interface Grade {
  /** S275 of `S 275`, S275JR, S355J2+N, S460M. */
  readonly name: string;
  /** Fine grain steel (N, NL, M, ML): f_y as of the others, f_u of standards that are not held here. */
  readonly fineGrain: boolean;
}

function readGrade(grade: string): Grade {
  const match = gradeName.exec(grade.trim());
  const quality = match?.[2]?.toUpperCase() ?? '';
  return {
    name: match ? `S${match[1] ?? ''}` : grade.trim(),
    fineGrain: /^[NM]/.test(quality),
  };
}

/** Nominal strengths of a grade at a thickness, N/mm². */
export interface NominalStrength {
  readonly f_y: number;
  /** Where f_y comes from. */
  readonly clause: string;
  /** f_u, recorded as read when it is asked for; undefined of a quality whose f_u is not held. */
  ultimate(): { readonly f_u: number; readonly clause: string } | undefined;
}

/**
 * f_y and f_u of a grade at a thickness, by the table that the profile's annex chooses.
 *
 * @param thickness nominal thickness of the thickest part in mm
 * @throws {Refusal} `unknown-grade`, `thickness-not-covered`
 */
export function steelStrength(
  grade: string,
  thickness: number,
  profile: ProfileReader,
): NominalStrength {
  const table = profile.choice<StrengthTable>('steel.strengths', [
    'table-3.1',
    'product-standards',
  ]);
  const { name, fineGrain } = readGrade(grade);
  const rows = Object.hasOwn(steelStrengths[table], name) ? steelStrengths[table][name] : undefined;
  if (!rows) {
    const known = Object.keys(steelStrengths[table]).join(', ');
    throw refusal('unknown-grade', `No strength is held for ${grade}; known are ${known}.`);
  }
  const row = rows.find(({ upTo }) => thickness <= upTo);
  if (!row) {
    const clause = rows[0]?.fy.clause ?? '';
    const message = `${clause} gives no strength of ${name} at ${thickness} mm.`;
    throw refusal('thickness-not-covered', message, clause);
  }
  const path = `strengths.${table}.${name}.upTo${row.upTo}`;
  const words = (value: { clause: string }): string =>
    `${value.clause}, ${name}, t ≤ ${row.upTo} mm`;
  profile.record(`${path}.fy`, row.fy);
  return {
    f_y: row.fy.value,
    clause: words(row.fy),
    ultimate: () => {
      // S460 is fine grain itself: its row is of EN 10025-4.
      if (fineGrain && name !== 'S460') return undefined;
      profile.record(`${path}.fu`, row.fu);
      return { f_u: row.fu.value, clause: words(row.fu) };
    },
  };
}

function refusal(code: string, message: string, clause?: string): Refusal {
  const item = { pointer: '/material/grade', code, message };
  return new Refusal(code, message, [clause === undefined ? item : { ...item, clause }]);
}
