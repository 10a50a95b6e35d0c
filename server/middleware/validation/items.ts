import type { ErrorObject } from 'ajv/dist/2020';
import type { RefusalItem } from '../../engine/refusal';
import type { NoBranch } from './branches';
import type { ContractSchema, QuantityRule } from './document';
import type { QuantityFault } from './keywords';
import { nearest } from './nearest';
import { either, fieldName, kindOf, quantityWords, shown, typeWords, unfit } from './words';

/** A longer list of words is not read out. */
const MOST_WORDS = 12;
const LONGEST_NAME = 100;

/** Pointer to a field; a name without end is cut, so that no answer is as long as the request. */
export const child = (pointer: string, name: string): string =>
  `${pointer}/${name.slice(0, LONGEST_NAME).replaceAll('~', '~0').replaceAll('/', '~1')}`;

const quoted = (words: readonly unknown[]) => either(words.map((word) => JSON.stringify(word)));

/** An item; `fix` only where there is one. */
function item(pointer: string, code: string, message: string, fix?: string): RefusalItem {
  return { pointer, code, message, ...(fix !== undefined && { fix }) };
}

function unknownField(pointer: string, name: string, parent: ContractSchema): RefusalItem {
  const names = Object.keys(parent.properties ?? {});
  const hints = parent['x-hints'] ?? {};
  const hint = Object.hasOwn(hints, name) ? hints[name] : undefined;
  const meant = nearest(name, names);
  const fix =
    hint ??
    (meant !== undefined
      ? `Did you mean \`${meant}\`?`
      : `Fields here: ${names.map((n) => `\`${n}\``).join(', ')}.`);
  const at = child(pointer, name);
  return item(at, 'unknown-field', `There is no field ${fieldName(at)}.`, fix);
}

function missingField(pointer: string, name: string, parent?: ContractSchema): RefusalItem {
  const at = child(pointer, name);
  const words = parent?.properties?.[name]?.enum;
  const fix = words && `Give ${quoted(words)}.`;
  return item(at, 'missing-field', `${fieldName(at)} is missing.`, fix);
}

function notOneOf(pointer: string, value: unknown, words: readonly unknown[]): RefusalItem {
  const sameType = words.some((word) => typeof word === typeof value);
  const list = quoted(words);
  if (!sameType) {
    return item(
      pointer,
      'wrong-type',
      `${fieldName(pointer)} must be ${list}; it is ${kindOf(value)}.`,
    );
  }
  const fault = typeof value === 'string' ? unfit(value) : undefined;
  if (fault) return item(pointer, fault.code, `${fieldName(pointer)} holds ${fault.words}.`);
  const wanted = words.length > MOST_WORDS ? `one of the contract's ${words.length} words` : list;
  const given = typeof value === 'string' ? JSON.stringify(shown(value)) : String(value);
  const meant = typeof value === 'string' ? nearest(value, words.map(String)) : undefined;
  return item(
    pointer,
    'not-one-of',
    `${fieldName(pointer)} is ${given}; it must be ${wanted}.`,
    meant === undefined ? undefined : `Did you mean ${JSON.stringify(meant)}?`,
  );
}

function wrongType(pointer: string, value: unknown, wanted: string): RefusalItem {
  const code = typeof value === 'number' && !Number.isFinite(value) ? 'not-finite' : 'wrong-type';
  return item(pointer, code, `${fieldName(pointer)} must be ${wanted}; it is ${kindOf(value)}.`);
}

function badQuantity(
  pointer: string,
  data: unknown,
  rule: QuantityRule,
  fault: QuantityFault,
): RefusalItem {
  const name = fieldName(pointer);
  const unit = rule.unit === '1' ? '' : ` ${rule.unit}`;
  switch (fault.code) {
    case 'wrong-type':
      return { ...wrongType(pointer, data, quantityWords(rule)), ...asText(data) };
    case 'negative': {
      const bound = rule.sign === 'positive' ? 'be more than 0' : 'be 0 or more';
      return item(pointer, 'negative', `${name} is negative; it must ${bound}.`);
    }
    case 'must-be-positive':
      return item(pointer, fault.code, `${name} is zero; it must be more than 0.`);
    case 'too-large': {
      const given = String(Number((fault.value ?? 0).toPrecision(6)));
      return item(pointer, fault.code, `${name} is ${given}${unit}; at most ${rule.max}${unit}.`);
    }
    case 'not-a-quantity': {
      const bare =
        typeof data === 'string' && data.length <= 40 && /^\s*[+-]?[\d.]+\s*$/.test(data);
      const fix = bare
        ? `Give it as a number, ${data.trim()}, or with its unit, "${data.trim()}${unit}".`
        : undefined;
      return item(pointer, fault.code, `${name} must be ${quantityWords(rule)}.`, fix);
    }
    case 'wrong-unit':
    case 'unknown-unit':
      return item(
        pointer,
        fault.code,
        `${name}: ${shown(fault.message ?? '', 120)}`,
        `Give ${quantityWords(rule)}.`,
      );
    default:
      return item(pointer, fault.code, `${name} must be a finite number.`);
  }
}

/** A quantity as answers carry it, written as a request takes it. */
function asText(data: unknown): { readonly fix: string } | undefined {
  if (data === null || typeof data !== 'object') return undefined;
  const { value, unit } = data as { readonly value?: unknown; readonly unit?: unknown };
  if (typeof value !== 'number' || typeof unit !== 'string') return undefined;
  return { fix: `Write it as text, "${value} ${shown(unit)}".` };
}

function badChoice(pointer: string, data: unknown, why: NoBranch): RefusalItem[] {
  if (why.because === 'type') {
    const quantity = why.quantity && quantityWords(why.quantity);
    const plain = why.types.filter((t) => !quantity || (t !== 'number' && t !== 'string'));
    const wanted = [quantity, typeWords(plain)].filter(Boolean).join(', or ');
    return [wrongType(pointer, data, wanted)];
  }
  const body = data as Readonly<Record<string, unknown>>;
  if (why.because === 'kind') {
    const at = child(pointer, why.property);
    if (Object.hasOwn(body, why.property)) return [notOneOf(at, body[why.property], why.values)];
    const fix = `Give ${quoted(why.values)}.`;
    return [item(at, 'missing-field', `${fieldName(at)} is missing.`, fix)];
  }
  const { wanted, known } = why;
  const parent = { properties: Object.fromEntries(wanted.map((name) => [name, {}])) };
  const strange = Object.keys(body)
    .slice(0, 100)
    .filter((key) => !known.includes(key));
  const misspelt = strange.filter((key) => nearest(key, wanted) !== undefined);
  if (misspelt.length > 0) return misspelt.map((key) => unknownField(pointer, key, parent));
  const at = child(pointer, wanted[0] ?? '');
  const fix = `Give ${either(wanted.map((name) => `\`${name}\``))}.`;
  return [item(at, 'missing-field', `${fieldName(at)} is missing.`, fix)];
}

function badPattern(pointer: string, data: string, schema: ContractSchema): RefusalItem {
  const name = fieldName(pointer);
  const fault = unfit(data);
  if (fault) return item(pointer, fault.code, `${name} holds ${fault.words}.`);
  if (data.trim() === '') return item(pointer, 'empty', `${name} is empty.`);
  const [example] = schema.examples ?? [];
  const fix = example === undefined ? undefined : `Write it like ${JSON.stringify(example)}.`;
  const message = `${name} is ${JSON.stringify(shown(data))}, which is not in the form it must have.`;
  return item(pointer, 'wrong-form', message, fix);
}

/** What Ajv and our keywords say of a fault, each its own part of it. */
interface FaultParams {
  readonly limit: number;
  readonly type: string | readonly string[];
  readonly missingProperty: string;
  readonly additionalProperty: string;
  readonly allowedValue: unknown;
  readonly allowedValues: readonly unknown[];
  readonly rule: QuantityRule;
  readonly fault: QuantityFault;
  readonly why: NoBranch;
  readonly names: readonly string[];
  readonly given: readonly string[];
}

/** The items of one of Ajv's errors; none for those that only say that a branch failed. */
export function itemsOf(error: ErrorObject): readonly RefusalItem[] {
  const { instancePath: pointer, keyword, data } = error;
  const params = error.params as FaultParams;
  const parent = (error.parentSchema ?? {}) as ContractSchema;
  const name = fieldName(pointer);
  const { limit } = params;
  switch (keyword) {
    case 'x-quantity':
      return [badQuantity(pointer, data, params.rule, params.fault)];
    case 'noBranch':
      return badChoice(pointer, data, params.why);
    case 'exactlyOne':
    case 'atMostOne':
      return badSelection(pointer, params.names, params.given);
    case 'additionalProperties':
      return [unknownField(pointer, params.additionalProperty, parent)];
    case 'required':
    case 'dependentRequired':
      return [missingField(pointer, params.missingProperty, parent)];
    case 'type':
      return [wrongType(pointer, data, typeWords([params.type].flat()))];
    case 'enum':
      return [notOneOf(pointer, data, params.allowedValues)];
    case 'const':
      return [notOneOf(pointer, data, [params.allowedValue])];
    case 'pattern':
      return [badPattern(pointer, data as string, parent)];
    case 'not':
      return [item(pointer, 'reserved-word', `${name} is a reserved word; choose another.`)];
    case 'minLength':
      return [item(pointer, data === '' ? 'empty' : 'too-short', `${name} is too short.`)];
    case 'minItems':
    case 'minProperties':
      return [tooFew(pointer, limit)];
    case 'maxLength':
      return [item(pointer, 'too-long', `${name} has more than ${limit} characters.`)];
    case 'maxItems':
    case 'maxProperties':
      return [item(pointer, 'too-many', `${name} has more than ${limit} items.`)];
    case 'uniqueItems':
      return [item(pointer, 'repeated', `${name} names the same thing twice.`)];
    case 'exclusiveMinimum':
      return [tooSmall(pointer, data as number, `more than ${limit}`)];
    case 'minimum':
      return [tooSmall(pointer, data as number, `at least ${limit}`)];
    case 'maximum':
      return [item(pointer, 'too-large', `${name} is ${String(data)}; at most ${limit}.`)];
    default:
      return keyword === 'if' ? [] : [item(pointer, 'not-valid', `${name} is not valid.`)];
  }
}

function tooFew(pointer: string, limit: number): RefusalItem {
  const message = limit > 1 ? `needs at least ${limit}` : 'is empty';
  return item(pointer, limit > 1 ? 'too-few' : 'empty', `${fieldName(pointer)} ${message}.`);
}

function tooSmall(pointer: string, value: number, wanted: string): RefusalItem {
  const code = value < 0 ? 'negative' : value === 0 ? 'must-be-positive' : 'too-small';
  return item(pointer, code, `${fieldName(pointer)} is ${value}; it must be ${wanted}.`);
}

function badSelection(
  pointer: string,
  names: readonly string[],
  given: readonly string[],
): RefusalItem[] {
  const words = either(names.map((name) => `\`${name}\``));
  const at = child(pointer, given[1] ?? names[0] ?? '');
  return given.length > 1
    ? [item(at, 'one-of-both', `Give ${words}, not both.`)]
    : [item(at, 'missing-field', `${fieldName(at)} is missing.`, `Give ${words}.`)];
}
