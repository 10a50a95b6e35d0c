import { inject } from '@angular/core';
import { type CanActivateFn, RedirectCommand, Router } from '@angular/router';
import { placesFor } from '../shell/places';
import { Session } from './session';

/** The start page is the first place that the person may go to. */
export const startGuard: CanActivateFn = async () => {
  const session = inject(Session);
  const router = inject(Router);
  const hidden = (path: string) =>
    new RedirectCommand(router.parseUrl(path), { skipLocationChange: true });
  try {
    const { person } = await session.ready();
    if (person === null) return router.parseUrl('/sign-in');
  } catch {
    return hidden('/away');
  }
  const places = placesFor((permission) => session.may(permission)).flatMap((each) => each.places);
  const first = places.find(({ outside }) => !outside);
  return first ? router.parseUrl(first.path) : hidden('/not-allowed');
};
