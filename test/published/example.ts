import { readFileSync } from 'node:fs';
import { join } from 'node:path';

/** A published value with its printed digits. */
export interface PublishedValue {
  readonly value: number;
  readonly unit: string;
  readonly as_printed: string;
  readonly half_unit_last_digit: number;
}

/** A worked example as `steel.json` holds it. */
export interface PublishedExample {
  readonly id: string;
  readonly title: string;
  readonly from_memory: boolean;
  readonly inputs: Readonly<Record<string, unknown>>;
  readonly published: Readonly<Record<string, PublishedValue>>;
}

export function readExamples(file: string): Map<string, PublishedExample> {
  const text = readFileSync(join(__dirname, file), 'utf8');
  const { examples } = JSON.parse(text) as { examples: PublishedExample[] };
  return new Map(examples.map((example) => [example.id, example]));
}

/** What the source's own rounding on its way may shift its result by. */
const ROUNDING_ON_THE_WAY = 5e-4;

export interface Comparison {
  readonly holds: boolean;
  readonly words: string;
}

/**
 * Our number against the printed one: within half a unit of the last printed digit, or, where a
 * reason says that the source itself rounded on its way, within 0.05 % besides.
 */
export function compare(
  example: PublishedExample,
  key: string,
  ours: number,
  roundedOnTheWay: string | undefined,
): Comparison {
  const printed = example.published[key];
  if (!printed) throw new Error(`${example.id} publishes no ${key}`);
  const { value, half_unit_last_digit, as_printed, unit } = printed;
  const within = half_unit_last_digit + roundingOf(value, roundedOnTheWay);
  return {
    holds: isWithin(ours, value, within),
    words: `${example.id} ${key}: printed ${as_printed} ${unit}, ours ${ours}`,
  };
}

/** A number that the source goes on from, and that the service makes by itself. */
export function compareInput(
  example: PublishedExample,
  key: string,
  { ours, half }: { readonly ours: number; readonly half: number },
  roundedOnTheWay: string | undefined,
): Comparison {
  const value = example.inputs[key];
  if (typeof value !== 'number') throw new Error(`${example.id} states no ${key}`);
  return {
    holds: isWithin(ours, value, half + roundingOf(value, roundedOnTheWay)),
    words: `${example.id} ${key}: stated ${value}, ours ${ours}`,
  };
}

function roundingOf(value: number, reason: string | undefined): number {
  return reason === undefined ? 0 : ROUNDING_ON_THE_WAY * Math.abs(value);
}

function isWithin(ours: number, value: number, within: number): boolean {
  return Math.abs(ours - value) <= within * (1 + 1e-9);
}
