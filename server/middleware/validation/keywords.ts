import type { Ajv2020 } from 'ajv/dist/2020';
import type { SchemaValidateFunction } from 'ajv/dist/types';
import { parseQuantity } from '../../engine/units/quantity';
import type { NoBranch } from './branches';
import type { QuantityRule } from './document';

/** What a quantity is at fault for; `message` where the reader of units has said it already. */
export interface QuantityFault {
  readonly code: string;
  readonly message?: string;
  readonly value?: number;
}

/** As QuantityInput of the contract has it. */
const LONGEST_TEXT = 40;

/** The fault of a value as a quantity, or nothing. */
export function quantityFault(rule: QuantityRule, data: unknown): QuantityFault | undefined {
  if (typeof data !== 'number' && typeof data !== 'string') return { code: 'wrong-type' };
  if (typeof data === 'string' && data.length > LONGEST_TEXT) return { code: 'not-a-quantity' };
  const parsed = parseQuantity(data, rule.unit);
  if (!parsed.ok) return { code: parsed.code, message: parsed.message };
  const { value } = parsed;
  if (value < 0 && rule.sign !== 'any') return { code: 'negative', value };
  if (value === 0 && rule.sign === 'positive') return { code: 'must-be-positive', value };
  if (Math.abs(value) > rule.max) return { code: 'too-large', value };
  return undefined;
}

function faulty(check: SchemaValidateFunction, keyword: string, params: object): false {
  check.errors = [{ keyword, params }];
  return false;
}

const isQuantity: SchemaValidateFunction = (rule: QuantityRule, data: unknown) => {
  const fault = quantityFault(rule, data);
  return fault === undefined || faulty(isQuantity, 'x-quantity', { rule, fault });
};

const exactlyOne: SchemaValidateFunction = (names: readonly string[], data: object) => {
  const given = names.filter((name) => Object.hasOwn(data, name));
  return given.length === 1 || faulty(exactlyOne, 'exactlyOne', { names, given });
};

const atMostOne: SchemaValidateFunction = (names: readonly string[], data: object) => {
  const given = names.filter((name) => Object.hasOwn(data, name));
  return given.length < 2 || faulty(atMostOne, 'atMostOne', { names, given });
};

const noBranch: SchemaValidateFunction = (why: NoBranch) => faulty(noBranch, 'noBranch', { why });

/** Adds the contract's own keywords: quantities, one field of several, a choice that fits none. */
export function addKeywords(ajv: Ajv2020): void {
  ajv.addKeyword({ keyword: 'x-quantity', validate: isQuantity, errors: true });
  ajv.addKeyword({ keyword: 'exactlyOne', validate: exactlyOne, type: 'object', errors: true });
  ajv.addKeyword({ keyword: 'atMostOne', validate: atMostOne, type: 'object', errors: true });
  ajv.addKeyword({ keyword: 'noBranch', validate: noBranch, errors: true });
  ajv.addKeyword({ keyword: 'x-hints', schemaType: 'object' });
}
