import { inject } from '@angular/core';
import { type CanActivateFn, RedirectCommand, Router } from '@angular/router';
import type { Permission } from './permission';
import { Session } from './session';
import { signInFor } from './sign-in-for';

/** Lets in who is signed in and may; the others get the reason, at the address they asked for. */
export const mayVisit =
  (permission?: Permission): CanActivateFn =>
  async (_route, { url }) => {
    const session = inject(Session);
    const router = inject(Router);
    const instead = (path: string) =>
      new RedirectCommand(router.parseUrl(path), { browserUrl: url });
    try {
      const { person } = await session.ready();
      if (person === null) return signInFor(router, url);
    } catch {
      return instead('/away');
    }
    if (permission === undefined || session.may(permission)) return true;
    return instead('/not-allowed');
  };
