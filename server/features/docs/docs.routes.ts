import express, { type RequestHandler } from 'express';
import swaggerUi from 'swagger-ui-express';
import contract from '../../../openapi/generated/openapi.served.json';
import { docsHeaders } from '../../middleware/headers';
import { ok, type Route } from '../../middleware/route';

// Written once: it is long, and whoever asks needs no key.
const text = JSON.stringify(contract);

/** The contract as it is answered today. */
export const contractRoutes = (): Route[] => [
  {
    method: 'get',
    path: '/v1/openapi.json',
    policy: { kind: 'public' },
    rate: 'counted',
    logged: false,
    handler: () => ok(text),
  },
];

/** Swagger UI: static files of its own, nothing of a caller. */
export function docs(): RequestHandler {
  const router = express.Router();
  const options = { url: '/v1/openapi.json', deepLinking: true, persistAuthorization: false };
  router.use(docsHeaders, swaggerUi.serve);
  router.get(
    '/',
    swaggerUi.setup(undefined, { swaggerOptions: options, customSiteTitle: 'Headtree API' }),
  );
  return router;
}
