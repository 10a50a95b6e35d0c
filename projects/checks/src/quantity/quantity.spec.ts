import { readable, utilisationText } from './format';
import { readList, writeList } from './read-list';
import { readNumber, writeNumber } from './read-number';
import { quantityNumber, readQuantity, writeQuantity } from './read-quantity';

const number = (text: string) => {
  const reading = readNumber(text);
  return reading.state === 'number' ? reading.number : reading.state;
};
const json = (text: string, unit: Parameters<typeof readQuantity>[1] = 'm') => {
  const reading = readQuantity(text, unit);
  return reading.state === 'ok' ? reading.value.json : reading.state;
};

it('reads a power of ten as part of its number, with a unit and without', () => {
  expect([json('1e9'), json('1.5e3 kN', 'kN'), json('2e-3 m')]).toEqual([1e9, 1500, 0.002]);
});

describe('a number', () => {
  it.each([
    ['12,5', 12.5],
    ['12.5', 12.5],
    ['.5', 0.5],
    ['−3', -3],
    ['0.125', 0.125],
    ['0,125', 0.125],
    ['1 234.567', 1234.567],
    ['1’234', 1234],
    ['1.234,5', 1234.5],
    ['1,234.5', 1234.5],
    ['1.234.567', 1234567],
    ['1.2340', 1.234],
    ['1234.567', 1234.567],
    ['2e3', 2000],
  ])('reads %s', (text, value) => expect(number(text)).toBe(value));

  it.each(['', 'x', '1 2', '1.2.3', '1,2.3,4', '-', '.', '12,34,5'])('refuses "%s"', (text) =>
    expect(number(text)).toBe('wrong'),
  );

  it.each(['1.234', '1,234', '-12.500', '999,000'])('asks about %s', (text) =>
    expect(number(text)).toBe('ambiguous'),
  );

  it('is written so that it reads back the same and is never asked about', () => {
    for (const value of [0, 3, 2.4, 1.234, -12.5, 12.345, 1e-7, 161.33333333333334, 1e22]) {
      expect(number(writeNumber(value, 1))).toBe(value);
    }
  });
});

describe('a quantity', () => {
  it.each([
    ['2.4', 2.4],
    ['2,4 m', 2.4],
    ['2400 mm', '2400 mm'],
    ['8 ft', '8 ft'],
    ['8ft', '8 ft'],
    ['  ', 'empty'],
    ['8 kN', 'wrong'],
    ['8 furlongs', 'wrong'],
    ['eight', 'wrong'],
  ])('reads "%s" as a length', (text, value) => expect(json(text)).toBe(value));

  it('reads units in any spelling', () => {
    expect(json('95 kn/M', 'kN/m')).toBe(95);
    expect(json('12 kNm', 'kN m')).toBe(12);
    expect(json('12 kN·m', 'kN m')).toBe(12);
    expect(json('6,2 kpa', 'kN/m^2')).toBe('6.2 kPa');
    expect(json('120 N/mm', 'kN/mm')).toBe('120 N/mm');
  });

  it('knows the size of another unit', () => {
    expect(quantityNumber('2400 mm', 'm')).toBe(2.4);
    expect(quantityNumber('8 ft', 'm')).toBeCloseTo(2.4384, 12);
  });

  it('asks which of two numbers is meant, and each choice can be read in one way only', () => {
    const reading = readQuantity('1.234', 'm');
    if (reading.state !== 'wrong') throw new Error('it was not asked');
    expect(reading.choices?.map(({ label }) => label)).toEqual(['1.234 m', '1234 m']);
    expect(reading.choices?.map(({ text }) => json(text))).toEqual([1.234, 1234]);
  });

  it('shows what the request holds', () => {
    expect([writeQuantity(1.234), writeQuantity('8 ft'), writeQuantity(undefined)]).toEqual([
      '1.2340',
      '8 ft',
      '',
    ]);
  });
});

describe('spans', () => {
  const list = (text: string) => {
    const reading = readList(text, 'm');
    return reading.state === 'ok' ? reading.value.map((one) => one.json) : reading;
  };

  it.each([
    ['3.0 + 3.0 + 2.4', [3, 3, 2.4]],
    ['3x2.4', [2.4, 2.4, 2.4]],
    ['2 × 3,0 + 2,4', [3, 3, 2.4]],
    ['3; 3; 2.4', [3, 3, 2.4]],
    ['3, 3, 2.4', [3, 3, 2.4]],
    ['3000 + 2400 mm', ['3000 mm', '2400 mm']],
    ['8 ft + 2.4 m', ['8 ft', 2.4]],
  ])('reads "%s"', (text, values) => expect(list(text)).toEqual(values));

  it('says what is wrong', () => {
    expect(list('3 + + 3')).toMatchObject({ state: 'wrong' });
    expect(list('3 + x')).toMatchObject({ state: 'wrong' });
    expect(list('60x2')).toMatchObject({ state: 'wrong' });
  });

  it('asks about one length and leaves the others as they are', () => {
    expect(list('2x3.0 + 1.234')).toMatchObject({
      choices: [{ text: '2x3.0 + 1.2340' }, { text: '2x3.0 + 1234' }],
    });
  });

  it('asks whether a unit at the end counts for all where it may not', () => {
    expect(list('2x3.0 + 8 ft')).toMatchObject({
      choices: [{ text: '2x3.0 ft + 8 ft' }, { text: '2x3.0 m + 8 ft' }],
    });
    expect(list('3.0 + 2.4 m')).toEqual([3, 2.4]);
  });

  it('are written as an engineer writes them', () => {
    expect(writeList([3, 3, 2.4])).toBe('3.0 + 3.0 + 2.4');
    expect(writeList([2.4, 2.4, 2.4, 2.4, '8 ft'])).toBe('4x2.4 + 8 ft');
    expect(list(writeList([1.234, 3]))).toEqual([1.234, 3]);
  });
});

describe('a number to read', () => {
  it('is rounded to four figures', () => {
    expect(
      [293802665.17, 0.9244162777, 404.5315989, 265, 1.35, -118.62, 7.05e11].map((n) =>
        readable(n),
      ),
    ).toEqual(['293\u202f800\u202f000', '0.9244', '404.5', '265', '1.35', '−118.6', '705·10⁹']);
  });

  it('never hides that a utilisation exceeds 1', () => {
    expect([0.912, 1, 1.0004, 1.00000001, null].map(utilisationText)).toEqual([
      '0.91',
      '1.00',
      '1.0004',
      '> 1',
      '–',
    ]);
  });
});
