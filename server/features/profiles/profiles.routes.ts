import { list, ok, type Route } from '../../middleware/route';
import { borrowerOf } from './borrower';
import type { ProfileService } from './profiles.service';

const shared = {
  method: 'get',
  policy: {
    kind: 'key',
    scope: 'catalogue',
    keyKinds: ['secret', 'page'],
    permission: 'profiles:read',
  },
  rate: 'counted',
  logged: true,
} as const;

export const profileRoutes = (profiles: ProfileService): Route[] => [
  {
    ...shared,
    path: '/v1/profiles',
    handler: async (asked) => list(await profiles.list(borrowerOf(asked))),
  },
  {
    ...shared,
    path: '/v1/profiles/:reference',
    handler: async (asked) =>
      ok(await profiles.read(asked.params.reference ?? '', borrowerOf(asked))),
  },
];
