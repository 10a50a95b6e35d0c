import { createServer, type Server } from 'node:net';
import type { AddressInfo } from 'node:net';
import { callScript } from '../support/script';

describe('where the service runs', () => {
  const place = (env: Record<string, string>) => callScript('lib/place.mjs', 'readPlace', env);

  it.each([
    [{}, 'http://127.0.0.1:4310'],
    [{ HEADTREE_HOST: '0.0.0.0', HEADTREE_PORT: '80' }, 'http://127.0.0.1:80'],
    [{ HEADTREE_HOST: '::' }, 'http://[::1]:4310'],
    [{ HEADTREE_HOST: 'fd00::1' }, 'http://[fd00::1]:4310'],
  ])('%j is reached at %s', async (env, url) => {
    expect(await place(env)).toMatchObject({ value: { url } });
  });

  it.each(['http', '0', '65536', '1.5'])('refuses port %s', async (port) => {
    expect(await place({ HEADTREE_PORT: port })).toEqual({
      stopped: `HEADTREE_PORT is "${port}": it must be a whole number from 1 to 65535.`,
    });
  });

  it('asks for both connections of a database of your own', async () => {
    const outcome = await place({ HEADTREE_DATABASE_URL: 'postgres://a:b@c/d' });
    expect(outcome).toEqual({
      stopped: expect.stringContaining('HEADTREE_DATABASE_OWNER_URL') as string,
    });
  });
});

describe('a port', () => {
  let taken: Server;
  let port: number;

  beforeAll(async () => {
    taken = createServer();
    await new Promise<void>((resolve) => taken.listen(0, '127.0.0.1', resolve));
    port = (taken.address() as AddressInfo).port;
  });
  afterAll(() => taken.close());

  it('for the database is another one when the remembered is taken', async () => {
    const outcome = await callScript('lib/port.mjs', 'freePort', port);
    expect(outcome).toEqual({ value: expect.any(Number) as number });
    expect(outcome).not.toEqual({ value: port });
  });

  it('for the API is asked for, not chosen: one that is taken stops the start', async () => {
    expect(await callScript('lib/port.mjs', 'requirePort', port, '127.0.0.1')).toEqual({
      stopped: `Port ${port} of 127.0.0.1 is in use by another program. Stop it, or choose another: HEADTREE_PORT=4311 npm start`,
    });
  });
});
