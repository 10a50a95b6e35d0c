import type { Routes } from '@angular/router';
import { mayVisit } from './core/session/guard';
import { startGuard } from './core/session/start-guard';

export const routes: Routes = [
  { path: '', pathMatch: 'full', canActivate: [startGuard], children: [] },
  {
    path: 'sign-in',
    title: 'Sign in',
    loadComponent: () => import('./features/sign-in/sign-in').then((m) => m.SignIn),
  },
  {
    path: 'checks',
    canActivate: [mayVisit('checks:run')],
    loadChildren: () => import('./features/checks/checks.routes').then((m) => m.checksRoutes),
  },
  {
    path: 'profiles',
    canActivate: [mayVisit('profiles:read')],
    loadChildren: () => import('./features/profiles/profiles.routes').then((m) => m.profilesRoutes),
  },
  {
    path: 'clients',
    canActivate: [mayVisit('clients:read')],
    loadChildren: () => import('./features/clients/clients.routes').then((m) => m.clientsRoutes),
  },
  {
    path: 'usage',
    canActivate: [mayVisit('usage:read')],
    loadChildren: () => import('./features/usage/usage.routes').then((m) => m.usageRoutes),
  },
  {
    path: 'not-allowed',
    title: 'Not for your role',
    loadComponent: () => import('./features/nowhere/not-allowed').then((m) => m.NotAllowed),
  },
  {
    path: 'away',
    title: 'Service away',
    loadComponent: () => import('./features/nowhere/away').then((m) => m.Away),
  },
  {
    path: '**',
    title: 'Nothing here',
    canActivate: [mayVisit()],
    loadComponent: () => import('./features/nowhere/not-found').then((m) => m.NotFound),
  },
];
