import { callScript } from '../support/script';

describe('a failure of the system is told with what to do', () => {
  it.each([
    ['ENOSPC: no space left on device, write', 'The disk that holds /home is full.'],
    ['FATAL: could not extend file "base/1/2691": wrote only 4096 of 8192 bytes', 'is full.'],
    ['initdb: error: could not create directory: No space left on device', 'is full.'],
    ["EROFS: read-only file system, mkdir '/x'", 'is on a read-only disk.'],
    ["EACCES: permission denied, mkdir '/x'", 'This user may not write in /home.'],
  ])('%s', async (said, told) => {
    const outcome = await callScript('lib/explain.mjs', 'advice', said, '/home');
    expect(outcome).toEqual({ value: expect.stringContaining(told) as string });
  });

  it('an unknown one is left to whoever asked', async () => {
    expect(await callScript('lib/explain.mjs', 'advice', 'something else', '/home')).toEqual({});
  });
});
