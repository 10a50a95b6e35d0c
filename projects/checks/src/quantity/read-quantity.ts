import type { QuantityInput } from '../contract';
import { readNumber, writeNumber } from './read-number';
import { readUnit, sameUnit, unitText, type FieldUnit } from './units';

/** A way to read a text, and the text that can be read in no other. */
export interface Choice {
  readonly label: string;
  readonly text: string;
}

/** What a field's text says. */
export type Reading<T> =
  | { readonly state: 'empty' }
  | { readonly state: 'ok'; readonly value: T }
  | { readonly state: 'wrong'; readonly message: string; readonly choices?: readonly Choice[] };

/** A quantity as the request takes it and as a number in the field's own unit. */
export interface Amount {
  readonly json: QuantityInput;
  readonly number: number;
}

/**
 * Reads a quantity in the field's own unit or in another that is named.
 *
 * @example readQuantity('12,5', 'kN/m') // { json: 12.5, number: 12.5 }
 * @example readQuantity('8 ft', 'm') // { json: '8 ft', number: 2.4384 }
 */
export function readQuantity(text: string, unit: FieldUnit): Reading<Amount> {
  const trimmed = text.trim();
  if (trimmed === '') return { state: 'empty' };
  const { digits, unitName } = split(trimmed);
  const reading = readNumber(digits);
  if (reading.state === 'wrong') {
    return { state: 'wrong', message: `Give a number, such as ${example(unit)}.` };
  }
  const named = unitName === '' ? undefined : readUnit(unitName, unit);
  if (named && !named.ok) return { state: 'wrong', message: named.message };
  if (reading.state === 'ambiguous') {
    const shown = named?.name ?? unit;
    const rest = unitName === '' ? '' : ` ${unitName}`;
    return {
      state: 'wrong',
      message: `“${digits}” can be read in two ways.`,
      choices: reading.readings.map((number) => ({
        label: `${number} ${unitText(shown)}`,
        text: `${writeNumber(number)}${rest}`,
      })),
    };
  }
  const { number } = reading;
  if (!named || sameUnit(named.name, unit)) return { state: 'ok', value: { json: number, number } };
  return { state: 'ok', value: { json: `${number} ${named.name}`, number: named.toField(number) } };
}

/** A request's quantity as a field shows it. */
export function writeQuantity(json: QuantityInput | undefined, decimals = 0): string {
  if (json === undefined) return '';
  if (typeof json === 'number') return writeNumber(json, decimals);
  const { digits, unitName } = split(json.trim());
  const number = Number(digits);
  return Number.isFinite(number) ? `${writeNumber(number)} ${unitName}`.trim() : json;
}

/** A request's quantity as a number in the field's own unit; undefined where it cannot be read. */
export function quantityNumber(json: QuantityInput | undefined, unit: FieldUnit) {
  if (json === undefined || typeof json === 'number') return json;
  const { digits, unitName } = split(json.trim());
  const named = readUnit(unitName, unit);
  return named.ok ? named.toField(Number(digits)) : undefined;
}

/** The number's part of a text and its unit's. */
export function split(text: string): { digits: string; unitName: string } {
  const found = /^([+\-−]?[\d.,\s'’\u00a0\u2009\u202f]*(?:(?<=\d)[eE][+-]?\d{1,3})?)(.*)$/s.exec(
    text,
  );
  return { digits: (found?.[1] ?? '').trim(), unitName: (found?.[2] ?? text).trim() };
}

function example(unit: FieldUnit): string {
  return unit === 'm' ? '2.4, 2,4 or 8 ft' : `12.5 or 12.5 ${unitText(unit)}`;
}
