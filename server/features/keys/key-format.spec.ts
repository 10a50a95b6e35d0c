import { keyKinds, keyPattern, mintKey, parseKey } from './key-format';

describe('a key', () => {
  it.each(keyKinds)('of kind %s is taken apart as it was minted', (kind) => {
    const { text, ...parts } = mintKey(kind);
    expect(text).toMatch(keyPattern);
    expect(parseKey(text)).toEqual(parts);
  });

  it('begins with the letters of its kind', () => {
    expect(keyKinds.map((kind) => mintKey(kind).text.slice(0, 4))).toEqual([
      'htk_',
      'htp_',
      'htc_',
    ]);
  });

  it('is never taken with one character changed', () => {
    const { text } = mintKey('secret');
    for (let index = 0; index < text.length; index++) {
      const other = text[index] === 'Q' ? 'R' : 'Q';
      expect(parseKey(text.slice(0, index) + other + text.slice(index + 1))).toBeUndefined();
    }
  });

  it('is never taken with two neighbours swapped', () => {
    const { text } = mintKey('page');
    for (let index = 4; index < text.length - 1; index++) {
      const swapped =
        text.slice(0, index) + text.charAt(index + 1) + text.charAt(index) + text.slice(index + 2);
      if (swapped !== text) expect(parseKey(swapped)).toBeUndefined();
    }
  });

  it('is never taken cut short, lengthened or with space about it', () => {
    const { text } = mintKey('cell');
    for (const wrong of ['', text.slice(0, -1), `${text}0`, ` ${text}`, `${text}\n`])
      expect(parseKey(wrong)).toBeUndefined();
  });

  it('favours no digit', () => {
    const counts = new Map<string, number>();
    for (let round = 0; round < 500; round++) {
      const { text } = mintKey('secret');
      for (const digit of text.slice(18, 60)) counts.set(digit, (counts.get(digit) ?? 0) + 1);
    }
    expect(counts.size).toBe(62);
    const mean = (500 * 42) / 62;
    for (const count of counts.values())
      expect(Math.abs(count - mean)).toBeLessThan(6.5 * Math.sqrt(mean));
  });
});
