import type { RequestHandler } from 'express';
import helmet from 'helmet';

/** Nothing that the API answers is a page; the few pages name what they need themselves. */
export const headers = helmet({
  contentSecurityPolicy: {
    useDefaults: false,
    directives: {
      defaultSrc: ["'none'"],
      baseUri: ["'none'"],
      formAction: ["'none'"],
      frameAncestors: ["'none'"],
    },
  },
  // Whoever puts TLS before the service decides it for the whole host.
  strictTransportSecurity: false,
  referrerPolicy: { policy: 'no-referrer' },
}) as RequestHandler;

/** Swagger UI writes style attributes: allowed on its own path only. */
export const docsHeaders: RequestHandler = (_request, response, next) => {
  response.setHeader(
    'Content-Security-Policy',
    "default-src 'none'; script-src 'self'; style-src 'self' 'unsafe-inline'; img-src 'self' data:; " +
      "connect-src 'self'; base-uri 'none'; form-action 'none'; frame-ancestors 'none'",
  );
  next();
};

/** A path that cannot be decoded leads nowhere, like any other that does not exist. */
export const plainPath: RequestHandler = (request, _response, next) => {
  try {
    decodeURIComponent(request.path);
  } catch {
    request.url = request.path.startsWith('/v1/') ? '/v1/-' : '/-';
  }
  next();
};
