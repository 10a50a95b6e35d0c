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
  readonly published: Readonly<Record<string, PublishedValue>>;
}

export function readExamples(file: string): Map<string, PublishedExample> {
  const text = readFileSync(join(__dirname, file), 'utf8');
  const { examples } = JSON.parse(text) as { examples: PublishedExample[] };
  return new Map(examples.map((example) => [example.id, example]));
}

/** What the source's own rounding on its way may shift its result by. */
const ROUNDING_ON_THE_WAY = 5e-4;

/**
 * Our number against the printed one: within half a unit of the last printed digit, or, where a
 * reason says that the source itself rounded on its way, within 0.05 % besides.
 */
export function compare(
  example: PublishedExample,
  key: string,
  ours: number,
  roundedOnTheWay: string | undefined,
): { readonly holds: boolean; readonly words: string } {
  const printed = example.published[key];
  if (!printed) throw new Error(`${example.id} publishes no ${key}`);
  const half = printed.half_unit_last_digit * (1 + 1e-9);
  const more = roundedOnTheWay === undefined ? 0 : ROUNDING_ON_THE_WAY * Math.abs(printed.value);
  return {
    holds: Math.abs(ours - printed.value) <= half + more,
    words: `${example.id} ${key}: printed ${printed.as_printed} ${printed.unit}, ours ${ours}`,
  };
}
