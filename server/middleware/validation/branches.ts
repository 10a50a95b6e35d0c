import { type ContractSchema, nameOf, type QuantityRule, resolved } from './document';

/** A schema as Ajv takes it: no OpenAPI words, each choice decided before its branches are tried. */
export type AjvSchema = Record<string, unknown> & {
  oneOf?: unknown;
  items?: unknown;
  uniqueItems?: unknown;
  if?: unknown;
  then?: unknown;
  not?: unknown;
  exactlyOne?: unknown;
  atMostOne?: unknown;
};

/** Why no branch of a choice was meant. */
export type NoBranch =
  | {
      readonly because: 'type';
      readonly types: readonly string[];
      readonly quantity?: QuantityRule;
    }
  | { readonly because: 'kind'; readonly property: string; readonly values: readonly string[] }
  | {
      readonly because: 'shape';
      /** One of these is wanted. */
      readonly wanted: readonly string[];
      /** All that any branch has. */
      readonly known: readonly string[];
    };

const wordsOfOpenApi = new Set(['discriminator', 'example', 'xml', 'externalDocs']);

const typesOf = (schema: ContractSchema): readonly string[] =>
  schema.type === undefined ? [] : [schema.type].flat();

/**
 * A choice (`oneOf`) told by `if` and `then`, so that only the branch the caller meant is heard:
 * first the type of the value, then a property with a constant, then the properties that only one
 * branch has.
 */
export function toAjv(schema: ContractSchema): AjvSchema {
  const out: AjvSchema = {};
  for (const [key, value] of Object.entries(schema)) {
    if (!wordsOfOpenApi.has(key)) out[key] = converted(key, value);
  }
  if (schema.oneOf) {
    delete out.oneOf;
    const onlyRequired = schema.oneOf.every((branch) => Object.keys(branch).join() === 'required');
    if (onlyRequired) {
      out.exactlyOne = schema.oneOf.map((branch) => branch.required?.[0]);
    } else {
      Object.assign(out, choice(schema.oneOf));
    }
  }
  if (schema.maxItems !== undefined) boundList(out, schema.maxItems);
  if (schema.not?.required) {
    delete out.not;
    out.atMostOne = schema.not.required;
  }
  return out;
}

/** The items of a list that is too long are not looked at: a megabyte of faults would take minutes. */
function boundList(out: AjvSchema, maxItems: number): void {
  const { items, uniqueItems } = out;
  delete out.items;
  delete out.uniqueItems;
  out.if = { type: 'array', maxItems };
  out.then = {
    type: 'array',
    ...(items !== undefined && { items }),
    ...(uniqueItems !== undefined && { uniqueItems }),
  };
}

function converted(key: string, value: unknown): unknown {
  switch (key) {
    case '$ref':
      return `contract#/$defs/${nameOf(value as string)}`;
    case 'properties':
      return Object.fromEntries(
        Object.entries(value as Record<string, ContractSchema>).map(([name, part]) => [
          name,
          toAjv(part),
        ]),
      );
    case 'items':
    case 'not':
      return toAjv(value as ContractSchema);
    case 'additionalProperties':
      return typeof value === 'boolean' ? value : toAjv(value as ContractSchema);
    default:
      return value;
  }
}

interface Branch {
  readonly schema: ContractSchema;
  readonly full: ContractSchema;
}

function choice(branches: readonly ContractSchema[]): AjvSchema {
  const all = branches.map((schema) => ({ schema, full: resolved(schema) }));
  const isObject = ({ full }: Branch) => typesOf(full).includes('object');
  const objects = all.filter(isObject);
  const others = all.filter((branch) => !isObject(branch));
  const types = [...new Set(all.flatMap(({ full }) => typesOf(full)))];
  const quantity = branches.find((branch) => branch['x-quantity'])?.['x-quantity'];
  let rest: AjvSchema = refuse({ because: 'type', types, ...(quantity && { quantity }) });
  if (objects.length > 0) {
    rest = { if: { type: 'object' }, then: choiceOfObjects(objects), else: rest };
  }
  return others.reduceRight(
    (after, { schema, full }) => ({ if: { type: full.type }, then: toAjv(schema), else: after }),
    rest,
  );
}

function choiceOfObjects(objects: readonly Branch[]): AjvSchema {
  const [only] = objects;
  if (only && objects.length === 1) return toAjv(only.schema);
  const kindOf = ({ full }: Branch): [string, string] | undefined => {
    const entry = Object.entries(full.properties ?? {}).find(([, part]) => 'const' in part);
    return entry && [entry[0], String(entry[1].const)];
  };
  const property = objects.map(kindOf).find((kind) => kind !== undefined)?.[0];
  const unkinded = objects.filter((branch) => kindOf(branch) === undefined);
  const values = [...new Set(objects.flatMap((branch) => kindOf(branch)?.[1] ?? []))];
  let rest = choiceByShape(unkinded, objects, property);
  if (property !== undefined) {
    const noKind = refuse({ because: 'kind', property, values });
    rest = unkinded.length === 0 ? noKind : { if: has(property), then: noKind, else: rest };
  }
  return values.reduceRight<AjvSchema>((after, value) => {
    const group = objects.filter((branch) => kindOf(branch)?.[1] === value);
    const mayBeLeftOut = group.some(({ full }) => !full.required?.includes(property ?? ''));
    const guard = { ...has(property ?? ''), properties: { [property ?? '']: { const: value } } };
    const isKind = mayBeLeftOut ? { type: 'object', properties: guard.properties } : guard;
    return { if: isKind, then: choiceByOwnProperties(group), else: after };
  }, rest);
}

/** Objects without a kind: the one whose own properties are there, else what they would be. */
function choiceByShape(
  branches: readonly Branch[],
  among: readonly Branch[],
  kind: string | undefined,
): AjvSchema {
  const wanted =
    kind === undefined
      ? branches.flatMap((branch) => ownProperties(branch, among))
      : [kind, ...identifying(branches)];
  const known = [...new Set(among.flatMap(({ full }) => Object.keys(full.properties ?? {})))];
  return branches.reduceRight<AjvSchema>(
    (after, branch) => ({
      if: hasAny(ownProperties(branch, among)),
      then: toAjv(branch.schema),
      else: after,
    }),
    refuse({ because: 'shape', wanted, known }),
  );
}

/** Branches of one kind: a later one when its own properties are there, else the first. */
function choiceByOwnProperties([first, ...later]: readonly Branch[]): AjvSchema {
  if (!first) throw new Error('A choice without a branch.');
  return later.reduceRight<AjvSchema>(
    (after, branch) => ({
      if: hasAny(ownProperties(branch, [first, ...later])),
      then: toAjv(branch.schema),
      else: after,
    }),
    toAjv(first.schema),
  );
}

const identifying = (branches: readonly Branch[]): readonly string[] =>
  branches.flatMap(({ full }) => full.required ?? []);

function ownProperties(branch: Branch, among: readonly Branch[]): readonly string[] {
  const others = new Set(
    among.filter((b) => b !== branch).flatMap(({ full }) => Object.keys(full.properties ?? {})),
  );
  return Object.keys(branch.full.properties ?? {}).filter((name) => !others.has(name));
}

const has = (property: string): AjvSchema => ({
  type: 'object',
  required: [property],
  properties: { [property]: true },
});
const hasAny = (names: readonly string[]): AjvSchema => ({ anyOf: names.map(has) });
const refuse = (why: NoBranch): AjvSchema => ({ noBranch: why });
