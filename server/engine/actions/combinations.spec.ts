import { ProfileReader } from '../profiles/reader';
import { publishedRevision } from '../testing/profiles';
import type { Action } from './action';
import { combine, uncombined } from './combinations';

const reader = () => new ProfileReader(publishedRevision('en-recommended'));
const earth: Action = { name: 'earth', nature: 'permanent' };
const wind: Action = { name: 'wind', nature: 'variable', category: 'wind' };
const snow: Action = { name: 'snow', nature: 'variable', category: 'snow' };
const impact: Action = { name: 'impact', nature: 'accidental' };

const factorsOf = (actions: Action[], situation: 'persistent' | 'accidental' | 'serviceability') =>
  combine(actions, situation, reader()).map(({ factors }) => factors);

describe('strength combinations by expression 6.10', () => {
  test('a permanent action counts by its upper and by its lower factor', () => {
    expect(factorsOf([earth], 'persistent')).toEqual([{ earth: 1.35 }, { earth: 1 }]);
  });

  test('each variable action leads in turn, the other accompanies with psi_0', () => {
    const list = factorsOf([earth, wind, snow], 'persistent');
    // Printed in MSB03 p.3-5: 1.35 G + 1.5 S + 0.9 W and 1.35 G + 1.5 W + 0.75 S.
    expect(list).toContainEqual({
      earth: 1.35,
      snow: 1.5,
      wind: expect.closeTo(0.9, 12) as number,
    });
    expect(list).toContainEqual({ earth: 1.35, wind: 1.5, snow: 0.75 });
  });

  test('every subset of the variable actions is a combination, the empty one too', () => {
    const subsets = new Set(
      factorsOf([wind, snow], 'persistent').map((factors) => Object.keys(factors).sort().join()),
    );
    expect(subsets).toEqual(new Set(['', 'wind', 'snow', 'snow,wind']));
  });

  test('combinations with the same factors are given once', () => {
    const list = factorsOf(
      [earth, { ...wind, category: 'surcharge' }, { ...snow, category: 'water' }],
      'persistent',
    );
    // Nothing reduces either, so that who leads makes no difference: 2 × (none, two, both).
    expect(list).toHaveLength(2 * 4);
  });

  test('own weight that nothing relieves counts by its upper factor alone', () => {
    expect(factorsOf([{ ...earth, neverFavourable: true }], 'persistent')).toEqual([
      { earth: 1.35 },
    ]);
  });
});

describe('accidental combinations by expression 6.11b', () => {
  test('nothing is factored but the variable actions by psi', () => {
    const list = factorsOf([earth, wind, snow, impact], 'accidental');
    expect(list).toContainEqual({ earth: 1, impact: 1, wind: 0.2, snow: 0 });
    expect(list).toContainEqual({ earth: 1, impact: 1, wind: 0, snow: 0.2 });
    expect(list.every((factors) => factors.earth === 1 && factors.impact === 1)).toBe(true);
  });

  test('two accidental actions never act together', () => {
    const list = factorsOf([earth, impact, { name: 'fire', nature: 'accidental' }], 'accidental');
    expect(list).toEqual([
      { earth: 1, impact: 1 },
      { earth: 1, fire: 1 },
    ]);
  });
});

test('characteristic combinations leave the leading action whole (6.14b)', () => {
  // Printed in MSB03 p.3-6: G + S + 0.6 W.
  expect(factorsOf([earth, wind, snow], 'serviceability')).toContainEqual({
    earth: 1,
    snow: 1,
    wind: 0.6,
  });
});

test('design values count once, by 1, and a variable one may be absent', () => {
  const made = uncombined([earth, wind], 'persistent', reader());
  expect(made.map(({ factors }) => factors)).toEqual([{ earth: 1 }, { earth: 1, wind: 1 }]);
  expect(made.every(({ expression }) => expression === 'none')).toBe(true);
});

describe('a variable action whose category the profile does not know', () => {
  test('is refused by name', () => {
    expect(() => factorsOf([{ ...wind, category: 'moonlight' }, snow], 'persistent')).toThrow(
      /moonlight/,
    );
    expect(() => factorsOf([{ name: 'wind', nature: 'variable' }, snow], 'persistent')).toThrow(
      /category/,
    );
  });
});

test('a single variable action always leads and reads no psi', () => {
  const profile = reader();
  combine([earth, { ...wind, category: 'temperature' }], 'persistent', profile);
  expect(profile.unconfirmed()).toEqual([]);
});
