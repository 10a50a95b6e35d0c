import { ok, type Route } from '../../middleware/route';
import type { Readiness } from './readiness';

const probe = { method: 'get', policy: { kind: 'public' }, rate: 'free', logged: false } as const;
const fresh = { 'Cache-Control': 'no-store' };

export const healthRoutes = (readiness: () => Promise<Readiness>): Route[] => [
  { ...probe, path: '/healthz', handler: () => ({ ...ok({ status: 'ok' }), headers: fresh }) },
  {
    ...probe,
    path: '/readyz',
    handler: async () => {
      const found = await readiness();
      const ready = found.database && found.listener;
      return {
        status: ready ? 200 : 503,
        body: { status: ready ? 'ready' : 'not-ready', ...found },
        headers: ready ? fresh : { ...fresh, 'Retry-After': '1' },
      };
    },
  },
];
