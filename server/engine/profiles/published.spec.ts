import { publishedProfiles } from './published';
import { canonicalJson } from './canonical';
import { ProfileReader, isProfileValue } from './reader';
import { publishedRevision } from '../testing/profiles';
import type { ProfileTree, ProfileValue } from './tree';

function leaves(tree: ProfileTree, path = ''): [string, ProfileValue][] {
  return Object.entries(tree).flatMap(([name, node]): [string, ProfileValue][] => {
    const here = path ? `${path}.${name}` : name;
    return isProfileValue(node) ? [[here, node]] : leaves(node, here);
  });
}

describe.each(publishedProfiles)('$slug', ({ tree }) => {
  test('every value names its clause and its source', () => {
    for (const [, leaf] of leaves(tree)) {
      expect(leaf.clause).toMatch(/\S/);
      expect(leaf.source).toMatch(/\S/);
      if (leaf.kind === 'recalled') expect(leaf.source).toBe('from memory, unconfirmed');
    }
  });

  test('it holds the values that every strength check reads', () => {
    const paths = new Set(leaves(tree).map(([path]) => path));
    for (const path of [
      'combinations.gamma_G_sup',
      'combinations.gamma_Q',
      'steel.gamma_M0',
      'steel.eta',
    ]) {
      expect(paths).toContain(path);
    }
  });

  test('a psi is never above 1', () => {
    for (const [path, { value }] of leaves(tree)) {
      if (path.startsWith('psi.')) expect(value).toBeLessThanOrEqual(1);
    }
  });
});

describe('what a check has read of a profile', () => {
  test('is recorded, and a recalled value that no example confirms makes it unconfirmed', () => {
    const reader = new ProfileReader(publishedRevision('uk-na'));
    reader.number('steel.eta');
    expect(reader.unconfirmed()).toEqual([]);
    reader.number('psi.wind.psi_0');
    expect(reader.unconfirmed()).toEqual([
      { path: 'psi.wind.psi_0', value: 0.5, clause: 'UK NA to EN 1990 Table NA.A1.1' },
    ]);
  });

  test('a value that the profile does not hold is refused by its path', () => {
    const reader = new ProfileReader(publishedRevision('uk-na'));
    expect(() => reader.number('timber.gamma_M')).toThrow(/timber.gamma_M/);
    expect(() => reader.number('__proto__.x')).toThrow(/__proto__/);
  });
});

test('canonical JSON sorts keys and drops what is undefined', () => {
  expect(canonicalJson({ b: [2, { d: 1, c: undefined }], a: 'x' })).toBe(
    '{"a":"x","b":[2,{"d":1}]}',
  );
});
