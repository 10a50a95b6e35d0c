import { sparkPath } from './spark-path';

describe('the path of a sparkline', () => {
  it('runs from the left to the right, with the greatest value on top', () => {
    expect(sparkPath([0, 1, 2], 300, 64).line).toBe('M0 61L150 32L300 3');
  });

  it('stands at the bottom where everything is zero', () => {
    expect(sparkPath([0, 0], 300, 64).line).toBe('M0 61L300 61');
  });

  it('breaks where there is nothing to show, and keeps a lone point visible', () => {
    expect(sparkPath([1, 1, null, 1], 300, 64).line).toBe('M0 3L100 3M297 3h6');
  });

  it('is empty without values', () => {
    expect(sparkPath([], 300, 64)).toEqual({ line: '', area: '' });
  });
});
