import { Ajv2020, type ValidateFunction } from 'ajv/dist/2020';
import type { RefusalItem } from '../../engine/refusal';
import { toAjv } from './branches';
import { contract, schemaNamed } from './document';
import { child, itemsOf } from './items';
import { addKeywords } from './keywords';
import { fieldName } from './words';

const MOST_ITEMS = 20;
/** Faults beyond these are not worded: a body made of nothing else would take seconds. */
const MOST_FAULTS = 200;

/** No object of the contract has nearly as many. */
const MOST_KEYS = 200;
const TOO_MANY_FIELDS = 'too-many-fields';

/** Keys that reach an object's prototype when a program copies them carelessly. */
const RESERVED_KEYS = new Set(['__proto__', 'constructor', 'prototype']);

const ajv = new Ajv2020({
  strict: true,
  strictTypes: true,
  strictTuples: true,
  allowUnionTypes: true,
  allErrors: true,
  verbose: true,
  validateSchema: false,
  formats: { 'uri-reference': true, 'date-time': true, password: true, uuid: true },
});
addKeywords(ajv);
ajv.addSchema({
  $id: 'contract',
  $defs: Object.fromEntries(
    Object.entries(contract.components.schemas).map(([name, schema]) => [name, toAjv(schema)]),
  ),
});

const compiled = new Map<string, ValidateFunction>();

function validator(schemaName: string): ValidateFunction {
  const known = compiled.get(schemaName);
  if (known) return known;
  schemaNamed(schemaName);
  const made = ajv.compile({ $ref: `contract#/$defs/${schemaName}` });
  compiled.set(schemaName, made);
  return made;
}

/** Compiles at start-up what will be asked for, so that the first call does not wait for it. */
export function prepareValidation(schemaNames: Iterable<string>): void {
  for (const name of schemaNames) validator(name);
}

/** Codes from the one that says most about its place to the one that says least. */
const vague = [
  'repeated',
  'wrong-form',
  'too-short',
  'too-long',
  'empty',
  'wrong-type',
  'not-valid',
];

const precision = ({ code }: RefusalItem) => vague.indexOf(code);
const depth = ({ pointer }: RefusalItem) => pointer.split('/').length;
const isMissing = ({ code }: RefusalItem) => Number(code === 'missing-field');

/** One item for each place, the most telling; the deepest places first, what is missing last. */
function ranked(items: readonly RefusalItem[]): RefusalItem[] {
  const best = new Map<string, RefusalItem>();
  for (const found of items) {
    const held = best.get(found.pointer);
    // On a tie the later one: what the field says of itself comes after what its type says.
    if (!held || precision(found) <= precision(held)) best.set(found.pointer, found);
  }
  return [...best.values()]
    .sort((a, b) => isMissing(a) - isMissing(b) || depth(b) - depth(a))
    .slice(0, MOST_ITEMS);
}

function faults(schemaName: string, body: unknown): readonly RefusalItem[] {
  const validate = validator(schemaName);
  return validate(body) ? [] : (validate.errors ?? []).slice(0, MOST_FAULTS).flatMap(itemsOf);
}

const isObject = (value: unknown): value is object => typeof value === 'object' && value !== null;

const isCrowded = (keys: readonly string[]) => keys.length > MOST_KEYS;

/** Whether a key stands anywhere that no schema has to think of; cheap, since hardly one does. */
function hasOddKeys(body: unknown): boolean {
  const open = [body].filter(isObject);
  for (let next = open.pop(); next; next = open.pop()) {
    if (!Array.isArray(next)) {
      const keys = Object.keys(next);
      if (isCrowded(keys) || keys.some((key) => RESERVED_KEYS.has(key))) return true;
    }
    for (const value of Object.values(next)) if (isObject(value)) open.push(value);
  }
  return false;
}

/** Reserved keys and objects with keys without end, wherever they stand. */
function oddKeys(body: unknown): RefusalItem[] {
  if (!hasOddKeys(body)) return [];
  const found: RefusalItem[] = [];
  const open: [string, unknown][] = [['', body]];
  for (let next = open.pop(); next && found.length < MOST_ITEMS; next = open.pop()) {
    const [pointer, value] = next;
    if (!isObject(value)) continue;
    if (!Array.isArray(value) && isCrowded(Object.keys(value))) {
      const message = `${fieldName(pointer)} has more than ${MOST_KEYS} fields.`;
      found.push({ pointer, code: TOO_MANY_FIELDS, message });
      continue;
    }
    for (const [key, part] of Object.entries(value)) {
      const at = child(pointer, key);
      if (Array.isArray(value) || !RESERVED_KEYS.has(key)) open.push([at, part]);
      else {
        const message = `There is no field ${fieldName(at)}, nor can there be.`;
        found.push({ pointer: at, code: 'unknown-field', message });
      }
    }
  }
  return found;
}

/**
 * What is wrong with a request's body, for the caller to mend; nothing when it is valid.
 *
 * @param schemaName name of the request in the contract, such as `WalerRequest`
 */
export function validateRequest(schemaName: string, body: unknown): RefusalItem[] {
  const odd = oddKeys(body);
  if (odd.some(({ code }) => code === TOO_MANY_FIELDS)) return ranked(odd);
  return ranked([...odd, ...faults(schemaName, body)]);
}

/** What is wrong with an answer against the contract; for tests and for the service's own watch. */
export function validateAnswer(schemaName: string, body: unknown): RefusalItem[] {
  return ranked(faults(schemaName, body));
}
