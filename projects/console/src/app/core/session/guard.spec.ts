import { Location } from '@angular/common';
import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { provideZonelessChangeDetection } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { ActivatedRoute, provideRouter } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { Api } from '../api/api';
import { Problem } from '../api/problem';
import { mayVisit } from './guard';
import { Session, type SessionState } from './session';

@Component({ template: '{{ name }}', changeDetection: ChangeDetectionStrategy.OnPush })
class Page {
  protected readonly name = inject(ActivatedRoute).snapshot.routeConfig?.path;
}

const away = new Problem(503, 'database-unavailable', 'The database is away', 'Ask again.');
const signedIn = (...permissions: string[]): SessionState => ({
  person: { id: 'p1', name: 'Niamh', email: 'n@firm.example', roles: ['admin'] },
  permissions,
  csrfToken: 't',
});

async function visit(path: string, session: SessionState | Problem) {
  const get = () =>
    session instanceof Problem ? Promise.reject(session) : Promise.resolve(session);
  TestBed.configureTestingModule({
    providers: [
      provideZonelessChangeDetection(),
      { provide: Api, useValue: { get } },
      provideRouter([
        { path: 'usage', component: Page, canActivate: [mayVisit('usage:read')] },
        { path: 'sign-in', component: Page },
        { path: 'not-allowed', component: Page },
        { path: 'away', component: Page },
      ]),
    ],
  });
  const harness = await RouterTestingHarness.create(path);
  return { shown: harness.routeNativeElement?.textContent, url: TestBed.inject(Location).path() };
}

describe('the guard of a page', () => {
  it('lets in who has the permission, and no further', async () => {
    const { shown, url } = await visit('/usage?answer=fail', signedIn('usage:read'));
    expect({ shown, url }).toEqual({ shown: 'usage', url: '/usage?answer=fail' });
    expect(TestBed.inject(Session).may('clients:write')).toBe(false);
  });

  it('sends who is not signed in to the sign-in, with the page they asked for', async () => {
    const nobody = { person: null, permissions: [], csrfToken: null };
    const { url } = await visit('/usage?answer=fail', nobody);
    expect(url).toBe('/sign-in?to=%2Fusage%3Fanswer%3Dfail');
  });

  it('says at the same address that a role may not see it', async () => {
    const { shown, url } = await visit('/usage', signedIn('checks:run'));
    expect({ shown, url }).toEqual({ shown: 'not-allowed', url: '/usage' });
  });

  it('keeps the address while the service is away', async () => {
    const { shown, url } = await visit('/usage', away);
    expect({ shown, url }).toEqual({ shown: 'away', url: '/usage' });
  });
});
