import type { HttpInterceptorFn, HttpRequest } from '@angular/common/http';
import { inject } from '@angular/core';
import { Session } from './session';

const reads = new Set(['GET', 'HEAD', 'OPTIONS']);

const isOurs = ({ url }: HttpRequest<unknown>): boolean =>
  url.startsWith('/v1/') && !url.startsWith('//');

/** Every change carries the session's token; no other site ever gets it. */
export const csrfInterceptor: HttpInterceptorFn = (request, next) => {
  const token = inject(Session).csrfToken();
  if (reads.has(request.method) || token === null || !isOurs(request)) return next(request);
  return next(request.clone({ setHeaders: { 'X-CSRF-Token': token } }));
};
