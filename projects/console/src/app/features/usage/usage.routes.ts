import type { Routes } from '@angular/router';

export const usageRoutes: Routes = [
  {
    path: '',
    title: 'Usage',
    loadComponent: () => import('./usage-page').then((m) => m.UsagePage),
  },
  {
    path: ':requestId',
    title: 'One call',
    loadComponent: () => import('./call-page').then((m) => m.CallPage),
  },
];
