import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { callScript } from '../support/script';

const wanted = {
  '': { version: '1.0.0' },
  'node_modules/a': { version: '1.2.3', integrity: 'sha512-a' },
  'node_modules/other-system': { version: '1.0.0', integrity: 'sha512-o', optional: true },
};
const installed = { 'node_modules/a': { version: '1.2.3', integrity: 'sha512-a' } };

describe('packages', () => {
  let root: string;

  beforeEach(() => {
    root = mkdtempSync(join(tmpdir(), 'headtree-spec-'));
    writeFileSync(join(root, 'package-lock.json'), JSON.stringify({ packages: wanted }));
    mkdirSync(join(root, 'node_modules'));
  });
  afterEach(() => rmSync(root, { recursive: true }));

  const stale = () => callScript('lib/packages.mjs', 'stalePackages', root);
  const install = (packages: unknown) =>
    writeFileSync(join(root, 'node_modules/.package-lock.json'), JSON.stringify({ packages }));

  it('are stale before the first installation, or after one that was cut off', async () => {
    expect(await stale()).toEqual({ value: 'none are there yet' });
  });

  it('are up to date though one for another system is not there', async () => {
    install(installed);
    expect(await stale()).toEqual({});
  });

  it('are stale when one has another version', async () => {
    install({ 'node_modules/a': { version: '1.2.4', integrity: 'sha512-a' } });
    expect(await stale()).toEqual({ value: 'node_modules/a differs' });
  });

  it('are stale when one has other content under the same version', async () => {
    install({ 'node_modules/a': { version: '1.2.3', integrity: 'sha512-b' } });
    expect(await stale()).toEqual({ value: 'node_modules/a differs' });
  });

  it.each([
    ['18.20.0', false],
    ['20.18.9', false],
    ['20.19.0', true],
    ['22.1.0', true],
  ])('with Node %s: %s', async (version, fits) => {
    const outcome = await callScript('lib/packages.mjs', 'requireNode', version);
    expect('stopped' in outcome).toBe(!fits);
  });
});
