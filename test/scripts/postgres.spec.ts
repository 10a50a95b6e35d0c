import { chmodSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { callScript } from '../support/script';

describe("finding PostgreSQL's programs", () => {
  let folder: string;

  beforeEach(() => (folder = mkdtempSync(join(tmpdir(), 'headtree-spec-'))));
  afterEach(() => rmSync(folder, { recursive: true }));

  function install(place: string, version: string, programs = ['postgres', 'initdb']): string {
    const bin = join(folder, place);
    mkdirSync(bin, { recursive: true });
    for (const program of programs) {
      writeFileSync(join(bin, program), `#!/bin/sh\necho "postgres (PostgreSQL) ${version}"\n`);
      chmodSync(join(bin, program), 0o755);
    }
    return bin;
  }

  const find = (major: number | null, path = '') =>
    callScript('lib/postgres.mjs', 'findPostgres', ...(major === null ? [undefined] : [major]), {
      debian: join(folder, 'debian'),
      path,
    });

  it("takes the newest of Debian's, by number", async () => {
    install('debian/9/bin', '9.6.1');
    install('debian/15/bin', '15.18');
    const newest = install('debian/17/bin', '17.2');
    expect(await find(0)).toEqual({});
    expect(await find(17)).toEqual({ value: { folder: newest, major: 17 } });
  });

  it('takes the version that made the cluster, though a newer one is there', async () => {
    const wanted = install('debian/15/bin', '15.18');
    install('debian/17/bin', '17.2');
    expect(await find(15)).toEqual({ value: { folder: wanted, major: 15 } });
  });

  it('passes over a client-only installation and looks along the path', async () => {
    install('debian/16/bin', '16.1', ['psql']);
    const bin = install('own/bin', '16.1');
    expect(await find(16, `${join(folder, 'nowhere')}:${bin}`)).toEqual({
      value: { folder: bin, major: 16 },
    });
  });

  it('finds nothing where there is none', async () => {
    expect(await find(15)).toEqual({});
  });
});
