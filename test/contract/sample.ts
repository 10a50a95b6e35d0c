import {
  contract,
  type ContractSchema,
  nameOf,
  resolved,
  schemaNamed,
} from '../../server/middleware/validation/document';

export type Json = null | boolean | number | string | Json[] | { [key: string]: Json };

/** One way to fill an object whose schema wants one of several fields, or at most one of them. */
export interface Variant {
  readonly schema: ContractSchema;
  readonly left: ReadonlySet<string>;
}

const onlyRequired = (schema: ContractSchema): readonly string[] => {
  const branches = schema.oneOf ?? [];
  const plain = branches.every((branch) => Object.keys(branch).join() === 'required');
  return plain ? branches.flatMap((branch) => branch.required ?? []) : [];
};

/** Fields of which an object has one, or at most one. */
export const alternatives = (schema: ContractSchema): readonly string[] =>
  schema.not?.required ?? onlyRequired(schema);

/** True where `oneOf` chooses between schemas, and not between required fields. */
export const isUnion = (schema: ContractSchema): boolean =>
  (schema.oneOf?.length ?? 0) > 0 && onlyRequired(schema).length === 0;

/** The ways to fill an object so that every field is there in one of them. */
export function variants(schema: ContractSchema): Variant[] {
  const names = alternatives(schema);
  const dependent = schema.dependentRequired ?? {};
  if (names.length === 0) return [{ schema, left: new Set() }];
  return names.map((chosen) => {
    const left = new Set(names.filter((name) => name !== chosen));
    for (const [name, needs] of Object.entries(dependent)) {
      if (needs.some((need) => left.has(need))) left.add(name);
    }
    return { schema, left };
  });
}

const quantities: Readonly<Record<string, number>> = { deg: 30, K: 15, mm: 12.5, 'mm^2': 900 };

/** A value that is valid, every field filled; of a choice the first branch. */
export function sample(given: ContractSchema): Json {
  const schema = resolved(given);
  const { examples, type } = schema;
  if (schema['x-quantity']) return quantities[schema['x-quantity'].unit] ?? 1.5;
  if (isUnion(schema)) return sample(schema.oneOf?.[0] ?? {});
  if (schema.const !== undefined) return schema.const;
  if (schema.enum) return schema.enum[0] ?? null;
  if (examples) return examples[0] as Json;
  switch ([type].flat()[0]) {
    case 'object':
      return sampleObject(variants(schema)[0] ?? { schema, left: new Set() });
    case 'array':
      return samples(schema.items ?? {}, schema.minItems ?? 1);
    case 'boolean':
      return true;
    case 'integer':
      return schema.minimum ?? 1;
    case 'number':
      return Math.min(1, schema.maximum ?? 1);
    case 'null':
      return null;
    default:
      return 'words';
  }
}

/** Several values, each its own where the contract shows several. */
export function samples(given: ContractSchema, count: number): Json[] {
  const examples = resolved(given)['x-quantity'] ? [] : (resolved(given).examples ?? []);
  return Array.from(
    { length: count },
    (_, i) => (examples[i] as Json | undefined) ?? sample(given),
  );
}

export function sampleObject({ schema, left }: Variant): Record<string, Json> {
  const fields = Object.entries(schema.properties ?? {}).filter(([name]) => !left.has(name));
  return Object.fromEntries(fields.map(([name, part]) => [name, sample(part)]));
}

/** Every field that a request of that name can have: `Schema.field`, by a walk of its own. */
export function fieldsOf(schemaName: string): Set<string> {
  const fields = new Set<string>();
  const seen = new Set<string>();
  const walk = (schema: ContractSchema, owner: string): void => {
    if (schema.$ref !== undefined) {
      const name = nameOf(schema.$ref);
      if (seen.has(name)) return;
      seen.add(name);
      walk(schemaNamed(name), name);
      return;
    }
    for (const [name, part] of Object.entries(schema.properties ?? {})) {
      fields.add(`${owner}.${name}`);
      walk(part, `${owner}.${name}`);
    }
    if (schema.items) walk(schema.items, `${owner}[]`);
    for (const branch of schema.oneOf ?? []) walk(branch, owner);
  };
  seen.add(schemaName);
  walk(schemaNamed(schemaName), schemaName);
  return fields;
}

/** Names of the schemas that bodies of requests are described by. */
export function requestNames(): string[] {
  return Object.keys(contract.components.schemas).filter((name) => name.endsWith('Request'));
}
