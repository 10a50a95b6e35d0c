import { fromFragment, toFragment } from './request-in-address';

const request = {
  profile: 'uk-na',
  section: 'UB 457x191x67',
  material: { type: 'steel', grade: 'S275' },
  loadBasis: 'characteristic',
  spans: [3, '2400 mm'],
  loads: [{ name: 'Erddruck γ²', nature: 'permanent', kind: 'uniform', value: 95 }],
};

describe('a request in the address', () => {
  it('comes back as it went in', () => {
    const fragment = toFragment(request);
    expect(fragment).toMatch(/^r=[\w-]+$/);
    expect(fromFragment(fragment)).toEqual(request);
  });

  it.each([null, '', 'r=', 'r=%%', 'r=abc', 'r=W10', 'other'])('is none in %s', (fragment) =>
    expect(fromFragment(fragment)).toBeNull(),
  );
});
