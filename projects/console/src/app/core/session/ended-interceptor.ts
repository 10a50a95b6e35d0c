import { HttpErrorResponse, type HttpInterceptorFn } from '@angular/common/http';
import { inject } from '@angular/core';
import { Router } from '@angular/router';
import { tap } from 'rxjs';
import { Session } from './session';
import { signInFor } from './sign-in-for';

/** A session that ended on the server leads to the sign-in, and back to where it ended. */
export const endedInterceptor: HttpInterceptorFn = (request, next) => {
  const session = inject(Session);
  const router = inject(Router);
  return next(request).pipe(
    tap({
      error: (error: unknown) => {
        if (!(error instanceof HttpErrorResponse) || error.status !== 401) return;
        if (request.url === '/v1/session' || session.person() === null) return;
        session.forget();
        void router.navigateByUrl(signInFor(router, router.url, true));
      },
    }),
  );
};
