import { readable } from '../quantity/format';

const RAISED = Array.from('⁰¹²³⁴⁵⁶⁷⁸⁹');

/**
 * A formula's text with its numbers, as it is read: rounded, with the signs of print.
 *
 * @example plainText('(1224000 mm^3) * (265 N/mm^2) / 1') // '(1 224 000 mm³) · (265 N/mm²) / 1'
 */
export function plainText(substituted: string): string {
  return substituted
    .replace(/(?<![\w.^])(?<!\^ )\d+(?:\.\d+)?(?:e[+-]?\d+)?/g, (text) => readable(Number(text)))
    .replace(/ ?\^ ?(\d)(?![\d.])/g, (_, digit: string) => RAISED[Number(digit)] ?? digit)
    .replace(/\s*\*\s*/g, ' · ')
    .replace(/-(?=[\d(\s])/g, '−')
    .replace(/>=/g, '≥')
    .replace(/<=/g, '≤');
}
