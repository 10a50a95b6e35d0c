import { list, ok, type Route } from '../../middleware/route';
import { findCall, listUsage, usageQuery } from './usage.service';

const shared = {
  method: 'get',
  policy: { kind: 'key', scope: 'admin', keyKinds: ['secret'], permission: 'usage:read' },
  rate: 'counted',
  logged: true,
} as const;

export const usageRoutes = (): Route[] => [
  {
    ...shared,
    path: '/v1/usage',
    query: usageQuery,
    handler: async ({ query }) => {
      const { items, nextPageToken } = await listUsage(query);
      return list(items, nextPageToken);
    },
  },
  {
    ...shared,
    path: '/v1/usage/:requestId',
    handler: async ({ params }) => ok(await findCall(params.requestId ?? '')),
  },
];
