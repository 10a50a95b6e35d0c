import express, { type Express } from 'express';
import type { Pool } from 'pg';
import type { Logger } from 'pino';
import type { Sequelize } from 'sequelize';
import type { Check } from './engine/checks/check';
import { checkRunner, type RunApart } from './features/checks/check-runner';
import { checkRoutes } from './features/checks/checks.routes';
import { CheckService, type Validate } from './features/checks/checks.service';
import { ClientKeyService } from './features/clients/client-keys.service';
import { clientRoutes } from './features/clients/clients.routes';
import { ClientService } from './features/clients/clients.service';
import { consoleFiles } from './features/console/console';
import { contractRoutes, docs } from './features/docs/docs.routes';
import { elementRoutes } from './features/elements/elements.routes';
import { formulaRoutes } from './features/formulas/formulas.routes';
import { healthRoutes } from './features/health/health.routes';
import type { Readiness } from './features/health/readiness';
import { homeRoutes } from './features/home/home.routes';
import { KeyCache } from './features/keys/key-cache';
import type { KeyStore } from './features/keys/key-store';
import { KeyUse } from './features/keys/key-use';
import { Attempts, type AttemptLimits } from './features/people/attempts';
import type { MatchPassword } from './features/people/password';
import { DatabasePersonStore } from './features/people/person-store';
import { sessionRoutes } from './features/people/session.routes';
import { localSignIn, SignIn } from './features/people/sign-in';
import { problemRoutes } from './features/problems/problems.routes';
import { ProfileCache } from './features/profiles/profile-cache';
import type { ProfileStore } from './features/profiles/profile-store';
import { profileRoutes } from './features/profiles/profiles.routes';
import { ProfileService } from './features/profiles/profiles.service';
import { sectionRoutes } from './features/sections/sections.routes';
import type { UsageLog } from './features/usage/usage-log';
import { usageRoutes } from './features/usage/usage.routes';
import { answers } from './middleware/answer';
import { bearer } from './middleware/bearer';
import type { ChangeFeed } from './middleware/change-feed';
import { cors } from './middleware/cors';
import { headers, plainPath } from './middleware/headers';
import { mount } from './middleware/mount';
import { limits, rateLimit, type Limits } from './middleware/rate-limit';
import { rateCounts } from './middleware/rate-store';
import { requestId, underVersion } from './middleware/request-id';
import { assertRoutes, type Route } from './middleware/route';
import { sessionCookie, sessions, type SessionSettings } from './middleware/session';

/** All that the application stands on; tests hand in what they want to see. */
export interface AppDeps {
  readonly checks: readonly Check[];
  readonly validate: Validate;
  /** Where costly checks run. */
  readonly runApart: RunApart;
  readonly pool: Pool;
  readonly sequelize: Sequelize;
  readonly keyStore: KeyStore;
  readonly profileStore: ProfileStore;
  readonly feed: ChangeFeed;
  readonly usage: UsageLog;
  readonly readiness: () => Promise<Readiness>;
  readonly logger: Logger;
  readonly matchPassword: MatchPassword;
  readonly session: SessionSettings;
  /** Where the console was built, if it was. */
  readonly consoleFolder?: string;
  readonly limits?: Limits;
  readonly attemptLimits?: AttemptLimits;
}

/** The route table: every door of the service, each with its policy. */
export function routeTable(deps: AppDeps): Route[] {
  const profiles = new ProfileService(new ProfileCache(deps.profileStore, deps.feed));
  const run = checkRunner(deps.runApart);
  const checks = new CheckService({ profiles, validate: deps.validate, run });
  const clients = new ClientService(deps.sequelize, profiles);
  const clientKeys = new ClientKeyService(deps.sequelize, clients, profiles);
  const people = new DatabasePersonStore();
  const attempts = new Attempts(deps.pool, deps.attemptLimits);
  const signIn = new SignIn({ people, match: deps.matchPassword, attempts });
  return [
    ...homeRoutes(deps.checks),
    ...elementRoutes(),
    ...healthRoutes(deps.readiness),
    ...problemRoutes(),
    ...contractRoutes(),
    ...checkRoutes(deps.checks, checks),
    ...formulaRoutes(),
    ...profileRoutes(profiles),
    ...sectionRoutes(),
    ...usageRoutes(),
    ...sessionRoutes(localSignIn(signIn), sessionCookie(deps.session)),
    ...clientRoutes(clients, clientKeys),
  ];
}

/**
 * Wires the application; opens nothing.
 *
 * @throws when a route has no policy or a check has no route.
 */
export function createApp(deps: AppDeps, routes: readonly Route[] = routeTable(deps)): Express {
  assertRoutes(
    routes,
    deps.checks.map(({ id }) => id),
  );
  const { keyStore, feed, logger, usage, pool } = deps;
  const keys = new KeyCache(keyStore, feed);
  const use = new KeyUse(keyStore, () => logger.warn('The last use of a key was not noted.'));
  const { send, fail } = answers({ usage, logger, onKeyUse: (id) => use.note(id) });
  const rate = rateLimit(rateCounts(pool), logger, deps.limits ?? limits);

  const session = sessions({
    pool,
    people: new DatabasePersonStore(),
    settings: deps.session,
    onStoreError: (message) => logger.error({ cause: message }, 'sessions'),
  });

  const app = express();
  app.disable('x-powered-by');
  app.set('etag', false);
  app.set('query parser', 'simple');
  app.set('case sensitive routing', true);
  app.set('strict routing', true);
  app.use(requestId, plainPath, headers);
  app.use('/docs', docs());
  app.use('/v1', underVersion, cors(keys), bearer(keys), session);
  if (deps.consoleFolder !== undefined) app.use(consoleFiles(deps.consoleFolder));
  mount(app, routes, { send, rate });
  app.use(fail);
  return app;
}
