import type { Router, UrlTree } from '@angular/router';

/** The sign-in page that leads back to where the person wanted to be. */
export const signInFor = (router: Router, to: string, ended = false): UrlTree =>
  router.createUrlTree(['/sign-in'], {
    queryParams: { ...(isInside(to) && to !== '/' && { to }), ...(ended && { ended: 1 }) },
  });

/** Only a path of this application is ever gone to. */
export const isInside = (to: string | null | undefined): to is string =>
  typeof to === 'string' && /^\/(?![/\\])/.test(to) && !to.startsWith('/sign-in');
