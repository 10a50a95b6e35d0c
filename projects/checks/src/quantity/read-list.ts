import type { QuantityInput } from '../contract';
import { readNumber, writeNumber } from './read-number';
import { readQuantity, split, writeQuantity, type Amount, type Reading } from './read-quantity';
import { sameUnit, type FieldUnit } from './units';

const REPEATED = /^(\d{1,2})\s*[x×*]\s*(.+)$/i;
const LONGEST = 51;
/** No span is longer, in the field's own unit. */
const GREATEST = 100;

interface Part {
  readonly times: number;
  readonly text: string;
}

/**
 * Reads quantities in a row. One unit at the end counts for all, where it can mean nothing else.
 *
 * @example readList('3.0 + 3.0 + 2.4', 'm') // 3, 3, 2.4
 * @example readList('3x2400 mm', 'm') // 2400 mm, three times
 */
export function readList(text: string, unit: FieldUnit): Reading<readonly Amount[]> {
  if (text.trim() === '') return { state: 'empty' };
  const parts = text.split(/\s*(?:\+|;|,\s+)\s*/).map(partOf);
  if (parts.some((part) => part.text === '')) {
    return { state: 'wrong', message: 'A length is missing between two plus signs.' };
  }
  const shared = sharedUnit(parts);
  if (shared && !sameUnit(shared, unit) && !tooLarge(parts)) return askWhose(parts, shared, unit);
  const amounts: Amount[] = [];
  for (const [index, part] of parts.entries()) {
    const reading = readQuantity(shared ? `${split(part.text).digits} ${shared}` : part.text, unit);
    if (reading.state === 'empty') continue;
    if (reading.state === 'wrong') {
      return 'choices' in reading
        ? { ...reading, choices: whole(parts, index, shared, reading.choices ?? []) }
        : reading;
    }
    for (let time = 0; time < part.times; time += 1) amounts.push(reading.value);
  }
  if (amounts.length > LONGEST) {
    return { state: 'wrong', message: `${amounts.length} are too many: ${LONGEST - 1} at most.` };
  }
  return { state: 'ok', value: amounts };
}

function partOf(text: string): Part {
  const repeated = REPEATED.exec(text.trim());
  if (!repeated) return { times: 1, text: text.trim() };
  return { times: Number(repeated[1]), text: (repeated[2] ?? '').trim() };
}

/** The last part's unit, where no other part has one of its own. */
function sharedUnit(parts: readonly Part[]): string {
  const units = parts.map(({ text }) => split(text).unitName);
  const last = units.at(-1) ?? '';
  return parts.length > 1 && units.slice(0, -1).every((name) => name === '') ? last : '';
}

/** Whether each number without a unit is no length in the field's own unit: 3000 is no span in m. */
function tooLarge(parts: readonly Part[]): boolean {
  return parts.slice(0, -1).every(({ text }) => {
    const reading = readNumber(split(text).digits);
    return reading.state === 'number' && reading.number > GREATEST;
  });
}

function askWhose(parts: readonly Part[], shared: string, unit: FieldUnit): Reading<never> {
  const choices = [shared, unit].map((name) => {
    const texts = parts.map(({ times, text }, index) => {
      const own = index < parts.length - 1 ? `${text} ${name}` : text;
      return times === 1 ? own : `${times}x${own}`;
    });
    return { label: texts.join(' + '), text: texts.join(' + ') };
  });
  return { state: 'wrong', message: `Does ${shared} count for all of them?`, choices };
}

function whole(
  parts: readonly Part[],
  at: number,
  shared: string,
  choices: readonly { label: string; text: string }[],
) {
  return choices.map(({ label, text }) => {
    const chosen = shared ? split(text).digits : text;
    const texts = parts.map((part, index) => {
      const own = index === at ? chosen : bare(part.text, shared);
      return part.times === 1 ? own : `${part.times}x${own}`;
    });
    return { label, text: texts.join(' + ') + (shared ? ` ${shared}` : '') };
  });
}

const bare = (text: string, shared: string) => (shared ? split(text).digits : text);

/** Quantities in a row as a field shows them; four alike or more are written once. */
export function writeList(values: readonly QuantityInput[], decimals = 1): string {
  const runs: { text: string; times: number }[] = [];
  for (const value of values) {
    const text = typeof value === 'number' ? writeNumber(value, decimals) : writeQuantity(value);
    const last = runs.at(-1);
    if (last?.text === text) last.times += 1;
    else runs.push({ text, times: 1 });
  }
  return runs
    .flatMap(({ text, times }) =>
      times < 4 ? Array<string>(times).fill(text) : [`${times}x${text}`],
    )
    .join(' + ');
}
