import type { IssuedKey } from './client';

/** The first request of the examples: a three-span waler. */
const example = (profile: string) => ({
  profile,
  section: 'UB 457x191x67',
  material: { type: 'steel', grade: 'S275' },
  loadBasis: 'characteristic',
  spans: [3, 3, 2.4],
  loads: [{ name: 'earth', nature: 'permanent', kind: 'uniform', value: 95 }],
  restraint: 'full',
});

/** What works as it is pasted: a line for a shell, or the markup of a page. */
export function snippetFor({ key, text }: IssuedKey, server: string, profile: string): string {
  if (key.kind === 'page')
    return [
      `<script async src="${server}/elements/v1/headtree-elements.js"></script>`,
      `<headtree-waler key="${text}" profile="${profile}" label="Waler"></headtree-waler>`,
    ].join('\n');
  if (!key.scopes.includes('checks')) {
    const path = key.scopes.includes('catalogue') ? 'profiles' : 'usage';
    return `curl -s ${server}/v1/${path} -H 'Authorization: Bearer ${text}'`;
  }
  return [
    `curl -s ${server}/v1/checks/waler \\`,
    `  -H 'Authorization: Bearer ${text}' -H 'Content-Type: application/json' \\`,
    `  -d '${JSON.stringify(example(profile))}'`,
  ].join('\n');
}
