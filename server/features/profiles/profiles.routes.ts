import { list, ok, type Route } from '../../middleware/route';
import { keyOf } from '../../middleware/key-of';
import type { ProfileService } from './profiles.service';

const shared = {
  method: 'get',
  policy: { kind: 'key', scope: 'catalogue', keyKinds: ['secret', 'page'] },
  rate: 'counted',
  logged: true,
} as const;

export const profileRoutes = (profiles: ProfileService): Route[] => [
  {
    ...shared,
    path: '/v1/profiles',
    handler: async (asked) => list(await profiles.list(keyOf(asked))),
  },
  {
    ...shared,
    path: '/v1/profiles/:reference',
    handler: async (asked) => ok(await profiles.read(asked.params.reference ?? '', keyOf(asked))),
  },
];
