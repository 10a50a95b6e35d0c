import { provideHttpClient, withFetch, withInterceptors } from '@angular/common/http';
import { APP_BASE_HREF } from '@angular/common';
import { type ApplicationConfig, inject, provideZonelessChangeDetection } from '@angular/core';
import { HEADTREE_CSRF_TOKEN } from '@headtree/checks';
import { MAT_DIALOG_DEFAULT_OPTIONS } from '@angular/material/dialog';
import { MAT_FORM_FIELD_DEFAULT_OPTIONS } from '@angular/material/form-field';
import { MATERIAL_ANIMATIONS } from '@angular/material/core';
import { MAT_SELECT_CONFIG } from '@angular/material/select';
import {
  provideRouter,
  TitleStrategy,
  withComponentInputBinding,
  withInMemoryScrolling,
} from '@angular/router';
import { routes } from './app.routes';
import { awayInterceptor } from './core/api/away-interceptor';
import { Session } from './core/session/session';
import { csrfInterceptor } from './core/session/csrf-interceptor';
import { endedInterceptor } from './core/session/ended-interceptor';
import { PageTitle } from './core/page/page-title';

export const appConfig: ApplicationConfig = {
  providers: [
    provideZonelessChangeDetection(),
    // The page has no <base>: its policy allows none.
    { provide: APP_BASE_HREF, useValue: '/' },
    { provide: HEADTREE_CSRF_TOKEN, useFactory: () => inject(Session).csrfToken },
    provideRouter(
      routes,
      withComponentInputBinding(),
      withInMemoryScrolling({ scrollPositionRestoration: 'enabled' }),
    ),
    provideHttpClient(
      withFetch(),
      withInterceptors([endedInterceptor, awayInterceptor, csrfInterceptor]),
    ),
    { provide: TitleStrategy, useClass: PageTitle },
    { provide: MATERIAL_ANIMATIONS, useValue: { animationsDisabled: true } },
    {
      provide: MAT_FORM_FIELD_DEFAULT_OPTIONS,
      useValue: {
        appearance: 'fill',
        floatLabel: 'always',
        hideRequiredMarker: true,
        subscriptSizing: 'dynamic',
      },
    },
    {
      provide: MAT_SELECT_CONFIG,
      useValue: { disableOptionCentering: true, hideSingleSelectionIndicator: true },
    },
    {
      provide: MAT_DIALOG_DEFAULT_OPTIONS,
      useValue: {
        ariaModal: true,
        hasBackdrop: true,
        autoFocus: 'first-heading',
        restoreFocus: true,
        maxWidth: 'min(640px, 94vw)',
      },
    },
  ],
};
