import { describeFormula } from '../../engine/formula/describe';
import { Problem } from '../../middleware/problem';
import type { Route } from '../../middleware/route';

export const formulaRoutes = (): Route[] => [
  {
    method: 'get',
    path: '/v1/formulas/:id',
    policy: {
      kind: 'key',
      scope: 'catalogue',
      keyKinds: ['secret', 'page'],
      permission: 'catalogue:read',
    },
    rate: 'counted',
    logged: true,
    handler: ({ params }) => {
      const body = describeFormula(params.id ?? '');
      if (!body) throw new Problem('not-found', 'There is no such formula.');
      // The same id always answers the same; `private`, since the answer is of a key.
      const headers = { 'Cache-Control': 'private, max-age=31536000, immutable' };
      return { status: 200, body, headers };
    },
  },
];
