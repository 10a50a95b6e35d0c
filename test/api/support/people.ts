import { hashPassword } from '../../../server/features/people/password';
import type { Role } from '../../../server/features/people/policy';
import { ask, type Answered, type Asking } from './ask';
import type { TestService } from './service';

export const password = 'correct horse battery staple';
/** Cheap, since most tests are not about passwords. */
const hash = hashPassword(password, 4);

/** Adds a person; gives the id. */
export async function addPerson(
  service: TestService,
  email: string,
  roles: readonly Role[],
  passwordHash = hash,
): Promise<string> {
  const [row] = await service.sql<{ id: string }>(
    `insert into users (email, name, password_hash, roles) values ($1, $2, $3, $4) returning id`,
    [email, `Person ${email}`, passwordHash, roles],
  );
  return row?.id ?? '';
}

export const trySignIn = (
  service: TestService,
  email: string,
  given = password,
  headers: Readonly<Record<string, string>> = {},
): Promise<Answered> =>
  ask(service.server, {
    method: 'post',
    path: '/v1/session',
    headers: { Origin: service.url, Host: new URL(service.url).host, ...headers },
    body: { email, password: given },
  });

/** `name=value` of the cookie that an answer sets. */
export const cookieOf = ({ headers }: Answered): string =>
  [headers['set-cookie'] ?? ''].flat().join().split(';', 1)[0] ?? '';

/** Somebody who is signed in, as a page of ours asks. */
export interface Visitor {
  readonly cookie: string;
  readonly csrfToken: string;
  ask(asking: Asking): Promise<Answered>;
}

export async function signIn(service: TestService, email: string): Promise<Visitor> {
  const answer = await trySignIn(service, email);
  if (answer.status !== 200) throw new Error(`${email} cannot sign in: ${answer.text}`);
  const cookie = cookieOf(answer);
  const csrfToken = String(answer.body.csrfToken);
  const origin = { Origin: service.url, Host: new URL(service.url).host };
  return {
    cookie,
    csrfToken,
    ask: ({ headers, ...asking }) =>
      ask(service.server, {
        ...asking,
        headers: { ...origin, Cookie: cookie, 'X-CSRF-Token': csrfToken, ...headers },
      }),
  };
}
