import type { Check } from '../../engine/checks/check';
import { Problem } from '../../middleware/problem';
import { list, ok, type Route } from '../../middleware/route';
import { borrowerOf } from '../profiles/borrower';
import type { CheckService } from './checks.service';
import { requestSchema } from './request-schema';

const reading = {
  method: 'get',
  policy: {
    kind: 'key',
    scope: 'catalogue',
    keyKinds: ['secret', 'page'],
    permission: 'catalogue:read',
  },
  rate: 'counted',
  logged: true,
} as const;

const checkRoute = (check: Check, service: CheckService): Route => ({
  method: 'post',
  path: `/v1/checks/${check.id}`,
  policy: { kind: 'key', scope: 'checks', keyKinds: ['secret', 'page'], permission: 'checks:run' },
  rate: 'counted',
  logged: true,
  query: { detail: ['full', 'summary'] },
  check: check.id,
  handler: async (asked) => {
    const { body, call, query } = asked;
    const detail = query.detail === 'summary' ? 'summary' : 'full';
    return ok(await service.answer(check, { body, detail, borrower: borrowerOf(asked), call }));
  },
});

/** Every check of the registry has its route here, and nowhere else. */
export const checkRoutes = (checks: readonly Check[], service: CheckService): Route[] => [
  {
    ...reading,
    path: '/v1/checks',
    handler: () =>
      list(
        checks.map(({ id, title }) => {
          const path = `/v1/checks/${id}`;
          return { id, title, path, schema: `${path}/schema` };
        }),
      ),
  },
  {
    ...reading,
    path: '/v1/checks/:check/schema',
    handler: ({ params }) => {
      const check = checks.find(({ id }) => id === params.check);
      if (!check) throw new Problem('not-found', 'There is no such check.');
      return ok(requestSchema(check.requestSchema));
    },
  },
  ...checks.map((check) => checkRoute(check, service)),
];
