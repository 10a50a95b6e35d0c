import type { OpenAPIV3_1 } from 'openapi-types';
import bundled from '../../../openapi/generated/openapi.json';
import type { UnitName } from '../../engine/units/units';

/** What the contract says of a quantity: its default unit, its sign, its limit in that unit. */
export interface QuantityRule {
  readonly unit: UnitName;
  readonly sign: 'any' | 'positive' | 'non-negative';
  readonly max: number;
}

/** A schema of the contract, with the extensions that the validation reads. */
export interface ContractSchema {
  readonly $ref?: string;
  readonly type?: string | readonly string[];
  readonly title?: string;
  readonly description?: string;
  readonly properties?: Readonly<Record<string, ContractSchema>>;
  readonly additionalProperties?: boolean | ContractSchema;
  readonly required?: readonly string[];
  readonly dependentRequired?: Readonly<Record<string, readonly string[]>>;
  readonly items?: ContractSchema;
  readonly oneOf?: readonly ContractSchema[];
  readonly not?: ContractSchema;
  readonly const?: string | number | boolean;
  readonly enum?: readonly (string | number)[];
  readonly examples?: readonly unknown[];
  readonly default?: unknown;
  readonly minimum?: number;
  readonly maximum?: number;
  readonly exclusiveMinimum?: number;
  readonly minItems?: number;
  readonly maxItems?: number;
  readonly minLength?: number;
  readonly maxLength?: number;
  readonly uniqueItems?: boolean;
  readonly pattern?: string;
  readonly format?: string;
  readonly 'x-quantity'?: QuantityRule;
  /** Why a field that a caller may expect is not one of this object's. */
  readonly 'x-hints'?: Readonly<Record<string, string>>;
}

type ContractDocument = Omit<OpenAPIV3_1.Document, 'components'> & {
  readonly components: {
    readonly schemas: Readonly<Record<string, ContractSchema>>;
    readonly examples: Readonly<Record<string, OpenAPIV3_1.ExampleObject>>;
    readonly responses: Readonly<Record<string, OpenAPIV3_1.ResponseObject>>;
  };
};

/** The whole contract, as `npm run contract` bundles it. */
export const contract = bundled as unknown as ContractDocument;

const prefix = '#/components/schemas/';

/** @throws {Error} when the contract has no schema of that name. */
export function schemaNamed(name: string): ContractSchema {
  const { schemas } = contract.components;
  const found = Object.hasOwn(schemas, name) ? schemas[name] : undefined;
  if (!found) throw new Error(`The contract has no schema ${name}.`);
  return found;
}

/** Name of the schema that a reference points to. */
export function nameOf(reference: string): string {
  if (!reference.startsWith(prefix)) throw new Error(`Not a schema's reference: ${reference}`);
  return reference.slice(prefix.length);
}

/** The schema behind a reference; what stands beside the reference goes first. */
export function resolved(schema: ContractSchema): ContractSchema {
  if (schema.$ref === undefined) return schema;
  const { $ref, ...beside } = schema;
  return { ...resolved(schemaNamed(nameOf($ref))), ...beside };
}
