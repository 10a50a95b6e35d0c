import type { Request, RequestHandler } from 'express';
import { Passport } from 'passport';
import { Strategy } from 'passport-local';
import { Problem } from '../../middleware/problem';
import { audit, personActor } from '../audit/audit';
import type { Attempts } from './attempts';
import type { MatchPassword } from './password';
import type { Person } from './person';
import type { PersonStore } from './person-store';

interface SignInDeps {
  readonly people: PersonStore;
  readonly match: MatchPassword;
  readonly attempts: Pick<Attempts, 'begin' | 'succeeded'>;
}

const refused = (): Problem =>
  new Problem('sign-in-refused', 'The email and the password do not belong together.', {
    headers: { 'WWW-Authenticate': 'Cookie realm="headtree"' },
  });

/** From an email and a password to a person. */
export class SignIn {
  constructor(private readonly deps: SignInDeps) {}

  /**
   * Who has no account, who is out of use and who mistypes get the same answer after the same work.
   *
   * @throws {Problem} `sign-in-refused` or `rate-limited`.
   */
  async check(email: string, password: string, address: string): Promise<Person> {
    const { people, match, attempts } = this.deps;
    const spelt = email.trim().toLowerCase();
    await attempts.begin(spelt, address);
    const account = await people.account(spelt);
    const right = await match(password, account?.passwordHash);
    if (!account || !right || account.disabled) {
      const subject = account ? personActor(account.person) : 'nobody';
      const detail = { address, ...(account?.disabled && { disabled: true }) };
      await audit({ actor: 'nobody', action: 'session.refused', subject, detail });
      throw refused();
    }
    const { person } = account;
    await attempts.succeeded(spelt, address);
    await people.noteSignIn(person.id);
    const actor = personActor(person);
    await audit({ actor, action: 'session.opened', subject: actor, detail: { address } });
    return person;
  }
}

export type Authenticate = (request: Request, address: string) => Promise<Person>;

/** The sign-in behind passport's local strategy, which takes both fields from the body. */
export function localSignIn(signIn: SignIn): Authenticate {
  return (request, address) => {
    const passport = new Passport();
    passport.use(
      new Strategy({ usernameField: 'email', session: false }, (email, password, done) => {
        signIn.check(email, password, address).then(
          (person) => done(null, person),
          (error: unknown) => done(error),
        );
      }),
    );
    return new Promise<Person>((resolve, reject) => {
      const done = (error: unknown, person: Person | false | undefined): void => {
        if (person) resolve(person);
        else reject(error instanceof Error ? error : refused());
      };
      const authenticate = passport.authenticate(
        'local',
        { session: false },
        done,
      ) as RequestHandler;
      if (!request.res) throw new Error('A request has its response.');
      authenticate(request, request.res, reject);
    });
  };
}
