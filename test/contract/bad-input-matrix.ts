import {
  type ContractSchema,
  nameOf,
  resolved,
  schemaNamed,
} from '../../server/middleware/validation/document';
import {
  alternatives,
  isUnion,
  type Json,
  sample,
  sampleObject,
  samples,
  variants,
} from './sample';

/** A body with one fault, and what must be said of it. */
export interface BadInputCase {
  readonly name: string;
  /** Where the fault lies. */
  readonly pointer: string;
  readonly body: Json;
  readonly expectedCode?: string;
  /** `Schema.field` of the contract that it is about. */
  readonly field: string;
}

/** A body that looks like a fault and is none: a zero or a negative where the contract allows it. */
export type AllowedCase = Omit<BadInputCase, 'expectedCode'>;

interface Matrix {
  readonly bad: BadInputCase[];
  readonly allowed: AllowedCase[];
}

/** A place in the body: how to put a value there, and what it is called. */
interface Place {
  readonly pointer: string;
  readonly field: string;
  readonly put: (value: Json) => Json;
}

type Report = (fault: string, value: Json, code?: string, below?: string) => void;

const matrices = new Map<string, Matrix>();

/** Every field of a request × every fault that can be made of it, each in a body else valid. */
export function badInputCases(schemaName: string): readonly BadInputCase[] {
  return matrix(schemaName).bad;
}

/** One case for each fault of each field, however many places of the body it can stand in. */
export function casesByField(schemaName: string): readonly BadInputCase[] {
  const faultOf = ({ name }: BadInputCase) => name.replace(/^[^:]*: /, '');
  const cases = badInputCases(schemaName).map((each) => [`${each.field} ${faultOf(each)}`, each]);
  return [...new Map(cases as [string, BadInputCase][]).values()];
}

/** Zeros and negatives that are no faults. */
export function allowedCases(schemaName: string): readonly AllowedCase[] {
  return matrix(schemaName).allowed;
}

function matrix(schemaName: string): Matrix {
  const known = matrices.get(schemaName);
  if (known) return known;
  const made: Matrix = { bad: [], allowed: [] };
  const root = { $ref: `#/components/schemas/${schemaName}` };
  visit(made, root, { pointer: '', field: schemaName, put: (value) => value });
  matrices.set(schemaName, made);
  return made;
}

function visit(made: Matrix, given: ContractSchema, place: Place): void {
  const schema = resolved(given);
  const { pointer, field } = place;
  const bad: Report = (fault, value, code, below = '') =>
    made.bad.push({
      name: `${pointer}${below || (pointer === '' ? 'body' : '')}: ${fault} (${field})`,
      pointer: pointer + below,
      body: place.put(value),
      field: below === '' ? field : `${field}.${below.slice(1)}`,
      ...(code !== undefined && { expectedCode: code }),
    });
  const allowed = (words: string, value: Json): void => {
    made.allowed.push({
      name: `${pointer}: ${words} (${field})`,
      pointer,
      body: place.put(value),
      field,
    });
  };
  const types = typesOf(schema);
  if (!schema['x-quantity']) wrongTypes(types, bad);
  if (isUnion(schema)) {
    for (const branch of schema.oneOf ?? []) visitBranch(made, branch, place);
  } else if (schema['x-quantity']) quantity(schema, bad, allowed);
  else if (schema.const !== undefined) bad('another word', 'no-such-word', 'not-one-of');
  else if (schema.enum) word(schema, bad);
  else if (types.includes('object')) object(made, schema, ownerOf(given, field), place);
  else if (types.includes('array')) array(made, schema, place, bad);
  else if (types.includes('string')) text(schema, bad);
  else if (types.includes('number') || types.includes('integer')) number(schema, bad);
}

/** Fields of a named schema are called by its name, wherever it stands. */
const ownerOf = (given: ContractSchema, field: string): string =>
  given.$ref === undefined ? field : nameOf(given.$ref);

/** A branch of a choice: its own faults, but not those of its type, which the choice has made. */
function visitBranch(made: Matrix, branch: ContractSchema, place: Place): void {
  const before = made.bad.length;
  visit(made, branch, place);
  const own = made.bad.splice(before);
  const ofType = (each: BadInputCase): boolean =>
    each.pointer === place.pointer && each.expectedCode === 'wrong-type';
  made.bad.push(...own.filter((each) => !ofType(each)));
}

function typesOf(schema: ContractSchema): readonly string[] {
  if (isUnion(schema)) return (schema.oneOf ?? []).flatMap((each) => typesOf(resolved(each)));
  return [schema.type ?? []].flat();
}

const valuesOfTypes: Readonly<Record<string, Json>> = {
  object: {},
  array: [],
  string: 'words',
  number: 7,
  boolean: true,
  null: null,
};

function wrongTypes(types: readonly string[], bad: Report): void {
  const taken = new Set(types.map((type) => (type === 'integer' ? 'number' : type)));
  for (const [type, value] of Object.entries(valuesOfTypes)) {
    if (!taken.has(type)) bad(`${type} for its value`, value, 'wrong-type');
  }
}

function quantity(
  schema: ContractSchema,
  bad: Report,
  allowed: (words: string, value: Json) => void,
): void {
  const rule = schema['x-quantity'];
  if (!rule) return;
  const { unit, sign, max } = rule;
  const wrongUnit = unit === 'kN' ? 'm' : 'kN';
  for (const value of [true, null, [], { value: 1, unit }]) {
    bad(`${JSON.stringify(value)} for its value`, value, 'wrong-type');
  }
  bad('wrong unit', `1 ${wrongUnit}`, 'wrong-unit');
  bad('unknown unit', '1 furlong', 'unknown-unit');
  bad('text without a unit', '1.5', 'not-a-quantity');
  bad('an expression', `1+1 ${unit}`, 'not-a-quantity');
  bad('empty text', '', 'not-a-quantity');
  bad('two numbers', `1 2 ${unit}`);
  bad('a control character', `1 ${unit}\u0000`);
  bad('huge', max * 10, 'too-large');
  bad('huge text', `${max * 10} ${unit}`, 'too-large');
  bad('beyond doubles', `1e999 ${unit}`);
  const negatives: Json[] = [-1, `-1 ${unit}`];
  for (const value of negatives) {
    if (sign === 'any') allowed(`negative ${JSON.stringify(value)}`, value);
    else bad(`negative ${JSON.stringify(value)}`, value, 'negative');
  }
  if (sign === 'positive') bad('zero', 0, 'must-be-positive');
  else allowed('zero', 0);
  allowed('text with its unit', `1.5 ${unit}`);
}

function word({ enum: words = [] }: ContractSchema, bad: Report): void {
  const [first] = words;
  if (typeof first !== 'string') {
    bad('another number', 99, 'not-one-of');
    return;
  }
  bad('another word', 'no-such-word', 'not-one-of');
  bad('in capitals with a blank', ` ${first.toUpperCase()}`, 'not-one-of');
  bad('a control character', `${first}\u0000`, 'control-character');
}

function text(schema: ContractSchema, bad: Report): void {
  const [valid = 'words'] = (schema.examples ?? []) as readonly string[];
  bad('empty', '', 'empty');
  bad('a control character', `${valid}\u0007`, 'control-character');
  bad('a line break', `${valid}\n${valid}`.slice(0, schema.maxLength));
  bad('half of a character', `${valid}\ud800`, 'not-text');
  if (schema.format !== 'password') {
    bad('blank', '      ');
    bad('a turn of direction', `${valid}\u202e`, 'control-character');
  }
  bad('too long', 'a'.repeat((schema.maxLength ?? 0) + 1));
  if (schema.not?.enum) bad('a reserved word', '__proto__', 'reserved-word');
}

function number(schema: ContractSchema, bad: Report): void {
  const { minimum, exclusiveMinimum, maximum, type } = schema;
  bad('a number as text', '1', 'wrong-type');
  if (minimum !== undefined || exclusiveMinimum !== undefined) bad('negative', -1, 'negative');
  if (exclusiveMinimum === 0 || (minimum ?? 0) > 0) bad('zero', 0, 'must-be-positive');
  if (maximum !== undefined) bad('huge', 1e9, 'too-large');
  if (type === 'integer') bad('a fraction', 1.5, 'wrong-type');
}

function array(made: Matrix, schema: ContractSchema, place: Place, bad: Report): void {
  const { minItems, maxItems, items, uniqueItems } = schema;
  if (!items) return;
  const one = sample(items);
  const filled = (count: number): Json[] => Array.from({ length: count }, () => one);
  if (minItems !== undefined) bad('empty', [], minItems > 1 ? 'too-few' : 'empty');
  if (maxItems !== undefined) bad('too many', filled(maxItems + 1), 'too-many');
  if (uniqueItems) bad('the same twice', [one, one], 'repeated');
  const beside = samples(items, minItems ?? 1).slice(1);
  visit(made, items, {
    pointer: `${place.pointer}/0`,
    field: `${place.field}[]`,
    put: (value) => place.put([value, ...beside]),
  });
}

/** Without these the body is of another branch, and that branch says what it wants. */
const toldElsewhere: Readonly<Record<string, { readonly at: string; readonly code?: string }>> = {
  'SectionByDesignation.designation': { at: 'shape' },
  'MomentUniformLoad.shape': { at: 'mid', code: 'unknown-field' },
  'MomentPointLoad.shape': { at: 'mid', code: 'unknown-field' },
};

function object(made: Matrix, schema: ContractSchema, owner: string, place: Place): void {
  for (const variant of variants(schema)) {
    const full = sampleObject(variant);
    const put = (name: string) => (value: Json) => place.put({ ...full, [name]: value });
    const report = (name: string, fault: string, body: Json, code: string): void => {
      const field = `${owner}.${name}`;
      const elsewhere = fault === 'missing' ? toldElsewhere[field] : undefined;
      made.bad.push({
        name: `${place.pointer}/${name}: ${fault} (${owner})`,
        pointer: `${place.pointer}/${elsewhere?.at ?? name}`,
        body: place.put(body),
        field,
        expectedCode: elsewhere?.code ?? code,
      });
    };
    for (const [name, part] of Object.entries(schema.properties ?? {})) {
      if (variant.left.has(name)) continue;
      visit(made, part, {
        pointer: `${place.pointer}/${name}`,
        field: `${owner}.${name}`,
        put: put(name),
      });
      if (schema.required?.includes(name)) {
        const rest = Object.entries(full).filter(([each]) => each !== name);
        report(name, 'missing', Object.fromEntries(rest), 'missing-field');
      }
    }
    if (schema.additionalProperties === false) {
      report('noSuchField', 'unknown', { ...full, noSuchField: 1 }, 'unknown-field');
    }
    report('constructor', 'reserved', { ...full, constructor: 1 }, 'unknown-field');
    report('__proto__', 'reserved', withOwnProto(full), 'unknown-field');
  }
  bothAlternatives(made, schema, owner, place);
}

/** As JSON.parse makes it: a field of its own, that a careless copy would turn into a prototype. */
const withOwnProto = (full: Record<string, Json>): Json =>
  Object.fromEntries([...Object.entries(full), ['__proto__', { polluted: true }]]);

function bothAlternatives(made: Matrix, schema: ContractSchema, owner: string, place: Place): void {
  const names = alternatives(schema);
  const [first, second] = names;
  if (first === undefined || second === undefined) return;
  const [variant] = variants(schema);
  if (!variant) return;
  const full = sampleObject({ schema, left: new Set() });
  made.bad.push({
    name: `${place.pointer}/${second}: beside ${first} (${owner})`,
    pointer: `${place.pointer}/${second}`,
    body: place.put(full),
    field: `${owner}.${second}`,
    expectedCode: 'one-of-both',
  });
  if (schema.not?.required) return;
  const left = new Set([...names, ...Object.keys(schema.dependentRequired ?? {})]);
  const neither = sampleObject({ schema, left });
  made.bad.push({
    name: `${place.pointer}/${first}: neither it nor ${second} (${owner})`,
    pointer: `${place.pointer}/${first}`,
    body: place.put(neither),
    field: `${owner}.${first}`,
    expectedCode: 'missing-field',
  });
}

/** A valid body of a request, every field filled. */
export function validBodies(schemaName: string): Json[] {
  const schema = schemaNamed(schemaName);
  const filled = isUnion(schema) ? (schema.oneOf ?? []).map(resolved) : [schema];
  return filled.flatMap((each) => variants(each).map(sampleObject));
}
