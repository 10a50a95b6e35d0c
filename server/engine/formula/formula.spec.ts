import { create, all, type Unit } from 'mathjs';
import '../checks/registry';
import { isUnitName, toUnit, type UnitName } from '../units/units';
import { describeFormula } from './describe';
import { formula } from './formula';
import { substituted } from './print';
import { allFormulas } from './registry';

if (!all) throw new Error('mathjs has no functions');
const math = create(all);

/** A small generator of its own, so that a failing case is always the same one. */
function numbers(seed: number): () => number {
  let state = seed;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32;
  };
}

/** Positive values of a like size for each unit; ratios near 1. */
function sample(where: Readonly<Record<string, UnitName>>, random: () => number) {
  return Object.fromEntries(
    Object.entries(where).map(([symbol, unit]) => [
      symbol,
      (unit === '1' ? 0.6 : 200) * (0.5 + random()),
    ]),
  );
}

function withUnits(values: Record<string, number>, where: Readonly<Record<string, UnitName>>) {
  return Object.fromEntries(
    Object.entries(values).map(([symbol, value]) => {
      const unit = where[symbol];
      if (!unit || !isUnitName(unit)) throw new Error(`${symbol} has no unit`);
      const number = toUnit(value, unit);
      return [symbol, unit === '1' ? number : math.unit(number, unit)];
    }),
  );
}

function numberIn(result: number | Unit, unit: UnitName): number {
  if (typeof result === 'number') {
    if (unit !== '1') throw new Error(`a bare number where ${unit} is stated`);
    return result;
  }
  return result.toNumber(unit);
}

const formulas = allFormulas();

describe('every formula of the engine', () => {
  test('there are formulas to prove, and their count is printed', () => {
    process.stdout.write(`formulas declared and proved by their dimensions: ${formulas.length}\n`);
    expect(formulas.length).toBeGreaterThan(20);
  });

  describe.each(formulas.map((one) => [one.id, one] as const))('%s', (_id, one) => {
    test('gives its stated unit and the same number with mathjs units', () => {
      const random = numbers(7);
      for (let round = 0; round < 20; round += 1) {
        const values = sample(one.where, random);
        const scope = withUnits(values, one.where);
        const expected = numberIn(math.evaluate(one.expression, scope) as number | Unit, one.unit);
        const computed = toUnit(one.compute(values), one.unit);
        expect(Math.abs(computed - expected)).toBeLessThanOrEqual(
          1e-9 * Math.abs(expected) + 1e-12,
        );
      }
    });

    test('its printed line evaluates to its value', () => {
      const values = sample(one.where, numbers(11));
      const line = substituted(one, values);
      const printed = numberIn(math.evaluate(line) as number | Unit, one.unit);
      const computed = toUnit(one.compute(values), one.unit);
      expect(Math.abs(printed - computed)).toBeLessThanOrEqual(1e-9 * Math.abs(computed) + 1e-12);
    });

    test('it has MathML in which every declared symbol stands', () => {
      const description = describeFormula(one.id);
      const text = JSON.stringify(description?.elements);
      for (const symbol of Object.keys(one.where)) expect(text).toContain(`"symbol":"${symbol}"`);
      expect(description?.mathml).toMatch(/^<math xmlns=.*<\/math>$/);
    });
  });
});

describe('a formula is refused at start-up', () => {
  const declare = (expression: string, where: Record<string, UnitName>) => () =>
    formula({ symbol: 'X', title: 'x', unit: '1', clause: 'none', expression, where });

  test.each([
    ['an undeclared E, which mathjs knows as 2.718', 'E / a', { a: '1' }],
    ['an undeclared tau, which mathjs knows as 6.28', 'tau * a', { a: '1' }],
    ['an undeclared h, which mathjs knows as a unit', 'a / h', { a: '1' }],
    ['a product without a sign', 'a / 2 b', { a: '1', b: '1' }],
    ['a unit that follows no number', 'a * mm', { a: '1' }],
    ['a symbol that is declared and not used', 'a', { a: '1', b: '1' }],
    ['a symbol that is a unit', 'm / a', { m: 'mm', a: 'mm' }],
    ['a function that is not allowed', 'gamma(a)', { a: '1' }],
    ['an assignment', 'a = 3', { a: '1' }],
    ['a comparison', 'a > 3', { a: '1' }],
    ['a conditional', 'a ? 1 : 2', { a: '1' }],
    ['a text', '"x"', {}],
    ['an index', 'a[1]', { a: '1' }],
    ['a property', 'a.b', { a: '1' }],
  ] as const)('%s', (_case, expression, where) => {
    expect(declare(expression, where)).toThrow();
  });

  test('the same line twice', () => {
    const one = declare('a + 1', { a: '1' });
    one();
    expect(one).toThrow(/twice/);
  });
});

describe('what a formula cannot hide', () => {
  test('a length added to a force is no sound formula for mathjs', () => {
    const wrong = formula({
      symbol: 'wrong',
      title: 'unsound',
      unit: 'kN',
      clause: 'none',
      expression: 'a + b',
      where: { a: 'kN', b: 'mm' },
    });
    const scope = withUnits({ a: 1, b: 2 }, wrong.where);
    expect(() => math.evaluate(wrong.expression, scope) as unknown).toThrow();
  });
});
