import { print } from './say.mjs';

/** A check that shows the service at work: a waler of three spans in a basement. */
const FIRST_CHECK = {
  profile: 'en-recommended',
  section: 'UB 457x191x67',
  material: { type: 'steel', grade: 'S275' },
  spans: [3, 3, 2.4],
  loadBasis: 'characteristic',
  loads: [
    { name: 'earth', nature: 'permanent', kind: 'uniform', value: 95 },
    {
      name: 'surcharge',
      nature: 'variable',
      category: 'surcharge',
      kind: 'uniform',
      value: 22,
    },
  ],
  restraint: 'full',
  deflectionLimit: 'span/200',
};

/**
 * What there is now and a first call that works as pasted.
 * @param {{ url: string, demoKey: string | undefined, demoPeople: import('./home.mjs').DemoPerson[], home: string }} place
 */
export function welcome({ url, demoKey, demoPeople, home }) {
  print('', `  Headtree  ${url}`, `  Docs      ${url}/docs`);
  for (const [index, { role, email, password }] of demoPeople.entries()) {
    const words = index === 0 ? 'Sign in as' : '';
    print(`  ${words.padEnd(10)} ${role}: ${email} password ${password}`);
  }
  if (demoKey !== undefined) {
    print(
      `  Key       ${demoKey}`,
      `            of this machine only, kept in ${home}`,
      '',
      '  A first check, to paste into another terminal:',
      '',
      `curl -s ${url}/v1/checks/waler -H 'Authorization: Bearer ${demoKey}' ` +
        `-H 'Content-Type: application/json' -d '${JSON.stringify(FIRST_CHECK)}'`,
    );
  }
  print('', '  Ctrl-C stops everything.', '');
}
