import { Ajv2020, type ValidateFunction } from 'ajv/dist/2020';
import type { RefusalItem } from '../../engine/refusal';
import { toAjv } from './branches';
import { contract, schemaNamed } from './document';
import { itemsOf } from './items';
import { addKeywords } from './keywords';
import { fieldName } from './words';

const MOST_ITEMS = 20;

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
  formats: { 'uri-reference': true },
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
  return validate(body) ? [] : (validate.errors ?? []).flatMap(itemsOf);
}

/** Keys that no body may have, wherever they stand. */
function reservedKeys(body: unknown): RefusalItem[] {
  const found: RefusalItem[] = [];
  const open: [string, unknown][] = [['', body]];
  for (let next = open.pop(); next; next = open.pop()) {
    const [pointer, value] = next;
    if (value === null || typeof value !== 'object') continue;
    for (const key of Object.keys(value)) {
      const at = `${pointer}/${key.replaceAll('~', '~0').replaceAll('/', '~1')}`;
      if (RESERVED_KEYS.has(key) && !Array.isArray(value)) {
        found.push({
          pointer: at,
          code: 'unknown-field',
          message: `There is no field ${fieldName(at)}, nor can there be.`,
        });
      } else {
        open.push([at, (value as Record<string, unknown>)[key]]);
      }
    }
    if (found.length >= MOST_ITEMS) break;
  }
  return found;
}

/**
 * What is wrong with a request's body, for the caller to mend; nothing when it is valid.
 *
 * @param schemaName name of the request in the contract, such as `WalerRequest`
 */
export function validateRequest(schemaName: string, body: unknown): RefusalItem[] {
  const reserved = reservedKeys(body);
  return ranked([...reserved, ...faults(schemaName, body)]);
}

/** What is wrong with an answer against the contract; for tests and for the service's own watch. */
export function validateAnswer(schemaName: string, body: unknown): RefusalItem[] {
  return ranked(faults(schemaName, body));
}
