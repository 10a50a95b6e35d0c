import { isAbsolute } from 'node:path';
import { readConfig, SettingsProblem } from './config';

const url = 'postgres://headtree_app:pw@127.0.0.1:5432/headtree';

function problemsOf(environment: Record<string, string>): readonly string[] {
  try {
    readConfig(environment);
  } catch (error) {
    if (error instanceof SettingsProblem) return error.problems;
  }
  return [];
}

describe('settings of a process', () => {
  it('takes the documented defaults', () => {
    expect(readConfig({ HEADTREE_DATABASE_URL: url })).toMatchObject({
      host: '127.0.0.1',
      port: 4310,
      databaseUrl: url,
      databaseOwnerUrl: undefined,
      log: 'info',
    });
  });

  it('makes the private folder absolute', () => {
    expect(isAbsolute(readConfig({ HEADTREE_DATABASE_URL: url }).home)).toBe(true);
  });

  it('takes an empty setting for one not given', () => {
    const config = readConfig({ HEADTREE_DATABASE_URL: url, HEADTREE_PORT: ' ', HEADTREE_LOG: '' });
    expect(config).toMatchObject({ port: 4310, log: 'info' });
  });

  it.each(['http', '-1', '65536', '43.1', '0x10'])('refuses port %s by name', (port) => {
    expect(problemsOf({ HEADTREE_DATABASE_URL: url, HEADTREE_PORT: port })).toEqual([
      `HEADTREE_PORT is "${port}": it must be a whole number from 0 to 65535.`,
    ]);
  });

  it('names every setting that cannot be used, all at once', () => {
    const problems = problemsOf({ HEADTREE_PORT: 'x', HEADTREE_LOG: 'loud' });
    expect(problems.map((problem) => problem.split(' ')[0])).toEqual([
      'HEADTREE_DATABASE_URL',
      'HEADTREE_PORT',
      'HEADTREE_LOG',
    ]);
  });

  it.each(['localhost/headtree', 'mysql://a@b/c', 'postgres://host'])(
    'refuses the connection %s without repeating it, for it may hold a password',
    (bad) => {
      const [problem] = problemsOf({ HEADTREE_DATABASE_URL: bad });
      expect(problem).toContain('HEADTREE_DATABASE_URL must read postgres://');
      expect(problem).not.toContain(bad);
    },
  );
});
