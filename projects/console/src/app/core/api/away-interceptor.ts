import { HttpErrorResponse, type HttpInterceptorFn } from '@angular/common/http';
import { inject } from '@angular/core';
import { tap } from 'rxjs';
import { Connection } from './connection';
import { problemOf } from './problem';

const awayCodes = new Set(['database-unavailable', 'log-unavailable']);

const saysAway = (error: unknown): boolean =>
  error instanceof HttpErrorResponse &&
  ([0, 502, 504].includes(error.status) ||
    (error.status === 503 && awayCodes.has(problemOf(error).code)));

/** Notices that the service does not answer, whoever asked. */
export const awayInterceptor: HttpInterceptorFn = (request, next) => {
  const connection = inject(Connection);
  return next(request).pipe(
    tap({ error: (error: unknown) => saysAway(error) && connection.lost() }),
  );
};
