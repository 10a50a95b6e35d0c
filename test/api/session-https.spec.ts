import { ask } from './support/ask';
import { addPerson, cookieOf, password, trySignIn } from './support/people';
import { startService, type TestService } from './support/service';

let service: TestService;
beforeAll(async () => {
  service = await startService({}, { session: { secret: 'of the tests alone', secure: true } });
  await addPerson(service, 'lead@firm.example', ['lead']);
});
afterAll(() => service.stop());

const https = { 'X-Forwarded-Proto': 'https' };

describe('where people come over https', () => {
  it('the cookie is for https, and for this host alone', async () => {
    const answer = await trySignIn(service, 'lead@firm.example', password, https);
    const cookie = String(answer.headers['set-cookie']);
    expect(cookie).toMatch(/^__Host-headtree=s%3A/);
    expect(cookie.split('; ').slice(1).sort()).toMatchObject([
      expect.stringMatching(/^Expires=/),
      'HttpOnly',
      'Path=/',
      'SameSite=Lax',
      'Secure',
    ]);
    const me = await ask(service.server, {
      path: '/v1/session',
      headers: { ...https, Cookie: cookieOf(answer) },
    });
    expect(me.body.person).toMatchObject({ email: 'lead@firm.example' });
  });

  it('over http no cookie is given', async () => {
    const answer = await trySignIn(service, 'lead@firm.example');
    expect(answer.headers['set-cookie']).toBeUndefined();
  });
});
