import type { CheckAnswer, CombinationLine, Verification } from '../contract';
import { fixed, readable } from '../quantity/format';

/** The word of a status. */
export const statusWord: Readonly<Record<CheckAnswer['status'], string>> = {
  pass: 'Pass',
  fail: 'Fail',
  incomplete: 'Incomplete',
  provisional: 'Provisional',
};

const NAMES: Readonly<Record<string, string>> = {
  'bending-y': 'bending about y-y',
  'bending-z': 'bending about z-z',
  'shear-z': 'shear along the web',
  'shear-y': 'shear along the flanges',
  'bending-shear-y': 'bending with shear',
  'bending-axial-y': 'bending with thrust',
  'bending-axial-z': 'bending about z-z with axial force',
  biaxial: 'bending about both axes',
  'shear-torsion': 'shear with torsion',
  'von-mises': 'von Mises’ criterion',
  'transverse-force': 'transverse force at the props',
  'transverse-force-bending': 'transverse force with bending',
  'lateral-torsional-buckling': 'lateral torsional buckling',
  'bearing-across-grain': 'bearing across the grain',
  'interaction-y': 'thrust with bending, y-y',
  'interaction-z': 'thrust with bending, z-z',
};

/** A verification in words, where no answer names it. */
export function verificationName(id: string): string {
  return NAMES[id] ?? id.replaceAll('-', ' ');
}

/** With a capital letter. */
export function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

/** Where a verification governs: "prop 2", "span 1, x = 1.35 m". */
export function placeText(at: Verification['at'], spans: number): string {
  if (!at) return 'the whole member';
  const where =
    at.support !== undefined
      ? `prop ${at.support}`
      : at.span === 0
        ? 'start overhang'
        : at.span > spans
          ? 'end overhang'
          : `span ${at.span}`;
  return `${where}, x = ${fixed(at.x, 2)} m`;
}

/** Where on the section a verification governs: the words of its point; '' where it is all of it. */
export function pointText(one: Verification, { points = [] }: CheckAnswer): string {
  if (one.point === undefined) return '';
  return points.find(({ id }) => id === one.point)?.title ?? one.point.replaceAll('-', ' ');
}

/** The terms of a combination: "1.35 earth", "1.50 surcharge". */
export function combinationTerms({ factors }: CombinationLine): string[] {
  return Object.entries(factors).map(([name, factor]) => `${fixed(factor, 2)} ${name}`);
}

/** How many, with its word: "1 value", "2 values". */
export function count(number: number, one: string, many = `${one}s`): string {
  return `${number} ${number === 1 ? one : many}`;
}

/** Why an answer is provisional, in words. */
export function provisionalReasons({ profile }: CheckAnswer): string[] {
  const reasons: string[] = [];
  const name = `${profile.slug} revision ${profile.revision}`;
  const standings: Readonly<Record<string, string>> = {
    draft: `${name} is a draft.`,
    'not-yet-in-effect': `${name} is not yet in effect.`,
    withdrawn: `${name} was withdrawn.`,
    expired: `${name} has expired.`,
  };
  const standing = standings[profile.standing];
  if (standing) reasons.push(standing);
  const open = profile.unconfirmed.length;
  if (open > 0) {
    reasons.push(
      `${count(open, 'value')} of ${name} that this check used ${open === 1 ? 'is' : 'are'} not confirmed against ${open === 1 ? 'its' : 'their'} source.`,
    );
  }
  return reasons;
}

/** A departure's or an unconfirmed value for the eye. */
export function valueText(value: number | string | null): string {
  if (value === null) return 'none';
  return typeof value === 'number' ? readable(value) : value;
}
