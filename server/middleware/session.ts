import type { Request, RequestHandler } from 'express';
import session from 'express-session';
import connectPgSimple from 'connect-pg-simple';
import type { Pool } from 'pg';
import type { SignedIn } from '../features/people/person';
import type { PersonStore } from '../features/people/person-store';
import { permissionsOf } from '../features/people/policy';
import { callOf } from './call';
import { patience } from './patience';
import { awayProblem } from './problem';

declare module 'express-session' {
  interface SessionData {
    personId: string;
    csrfToken: string;
    /** Milliseconds since 1970. */
    signedInAt: number;
  }
}

/** A session ends this long after its last request, */
const idleMs = 8 * 3_600_000;
/** and at last a week after the sign-in. */
const longestMs = 7 * 86_400_000;

export interface SessionSettings {
  /** Signs the cookie: whoever reads the table of sessions still cannot use one. */
  readonly secret: string;
  /** Whether people reach the service over https. */
  readonly secure: boolean;
}

/** What the sign-in does with the cookie. */
export interface SessionCookie {
  /** Under a new id: one that somebody had planted before the sign-in is worth nothing. */
  open(request: Request, personId: string, csrfToken: string): Promise<void>;
  close(request: Request): Promise<void>;
  /** Set-Cookie that removes it. */
  readonly cleared: string;
}

interface SessionDeps {
  readonly pool: Pool;
  readonly people: Pick<PersonStore, 'find'>;
  readonly settings: SessionSettings;
  readonly onStoreError: (message: string) => void;
}

type Done = (error?: unknown) => void;

const settled = (act: (done: Done) => void): Promise<void> =>
  new Promise((resolve, reject) => {
    act((error) => {
      if (error === undefined || error === null) resolve();
      else reject(awayProblem('database-unavailable', error));
    });
  });

const cookieName = ({ secure }: SessionSettings): string =>
  secure ? '__Host-headtree' : 'headtree';

export function sessionCookie(settings: SessionSettings): SessionCookie {
  const secure = settings.secure ? '; Secure' : '';
  return {
    open: async (request, personId, csrfToken) => {
      await settled((done) => request.session.regenerate(done));
      Object.assign(request.session, { personId, csrfToken, signedInAt: Date.now() });
      await settled((done) => request.session.save(done));
    },
    close: async (request) => {
      // It may be gone already, with the person it was of.
      const { session: open } = request as { session?: typeof request.session };
      if (open) await settled((done) => open.destroy(done));
    },
    cleared: `${cookieName(settings)}=; Path=/; Expires=Thu, 01 Jan 1970 00:00:00 GMT; HttpOnly; SameSite=Lax${secure}`,
  };
}

/** Sessions of people, in the database. A request that carries a key has none. */
export function sessions({ pool, people, settings, onStoreError }: SessionDeps): RequestHandler {
  const { secret, secure } = settings;
  const Store = connectPgSimple(session);
  const patient = {
    query: (text: string, values: unknown[]) => pool.query({ ...patience, text, values }),
  };
  const read = session({
    name: cookieName(settings),
    secret,
    resave: false,
    saveUninitialized: false,
    rolling: true,
    // Whoever puts TLS before the service says so in X-Forwarded-Proto.
    proxy: secure,
    cookie: { httpOnly: true, sameSite: 'lax', secure, path: '/', maxAge: idleMs },
    store: new Store({
      pool: patient as unknown as Pool,
      tableName: 'sessions',
      ttl: idleMs / 1_000,
      // The worker does it, as the owner.
      pruneSessionInterval: false,
      errorLog: (...words: unknown[]) => onStoreError(words.map(messageOf).join(' ')),
    }),
  });

  const signedIn = async (request: Request): Promise<SignedIn | undefined> => {
    const { personId, csrfToken, signedInAt } = request.session;
    if (personId === undefined || csrfToken === undefined) return undefined;
    const inTime = Date.now() - (signedInAt ?? 0) < longestMs;
    const person = inTime ? await people.find(personId) : undefined;
    if (person) return { ...person, permissions: new Set(permissionsOf(person.roles)), csrfToken };
    await settled((done) => request.session.regenerate(done));
    return undefined;
  };

  return (request, response, next) => {
    const isSignIn = request.path === '/session';
    const { authorization, cookie } = request.headers;
    if (!isSignIn && (authorization !== undefined || cookie === undefined)) {
      next();
      return;
    }
    const away = (error: unknown): void => next(awayProblem('database-unavailable', error));
    read(request, response, (error?: unknown) => {
      if (error !== undefined && error !== null) {
        away(error);
        return;
      }
      signedIn(request).then((person) => {
        if (!callOf(response).key) callOf(response).person = person;
        next();
      }, away);
    });
  };
}

const messageOf = (word: unknown): string => {
  if (word instanceof Error) return word.message;
  return typeof word === 'string' ? word : 'unknown';
};
