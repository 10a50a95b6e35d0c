import { parseQuantity, readQuantity } from './quantity';

describe('a quantity in a request', () => {
  test.each([
    [2.4, 'm', 2.4],
    ['2400 mm', 'm', 2.4],
    ['8 ft', 'm', 2.4384],
    ['95 kN/m', 'kN/m', 95],
    ['161.3 kNm', 'kN m', 161.3],
    ['161.3 kN·m', 'kN m', 161.3],
    ['161.3 kN m', 'kN m', 161.3],
    ['275 MPa', 'N/mm^2', 275],
    ['275 N/mm²', 'N/mm^2', 275],
    ['6.2 kN/m2', 'kN/m^2', 6.2],
    ['1.5e3 mm⁴', 'mm^4', 1500],
    ['371 cm4', 'mm^4', 3710000],
    ['30 °', 'deg', 30],
    ['20 °C', 'K', 20],
    ['-12 kN', 'kN', -12],
  ] as const)('%p in %s is %p', (input, unit, value) => {
    const parsed = parseQuantity(input, unit);
    expect(parsed).toEqual({ ok: true, value: expect.closeTo(value, 9) as number });
  });

  test.each([
    ['2.4', 'not-a-quantity'],
    ['2,4 m', 'not-a-quantity'],
    ['2.4m', 'not-a-quantity'],
    ['2.4 kN', 'wrong-unit'],
    ['2.4 furlong', 'unknown-unit'],
    ['1e999 m', 'not-finite'],
    ['1+1 m', 'not-a-quantity'],
    ['', 'not-a-quantity'],
  ])('%p is refused as %s', (input, code) => {
    expect(parseQuantity(input, 'm')).toMatchObject({ ok: false, code });
  });

  test('a kip is the international one', () => {
    expect(readQuantity('1 kip', 'kN')).toBeCloseTo(4448.2216152605, 10);
    expect(readQuantity('1 ksi', 'N/mm^2')).toBeCloseTo(6.894757293168, 10);
  });
});
