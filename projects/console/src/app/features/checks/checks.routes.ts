import type { Routes } from '@angular/router';

export const checksRoutes: Routes = [
  { path: '', pathMatch: 'full', redirectTo: 'waler' },
  {
    path: 'waler',
    title: 'Waler check',
    loadComponent: () => import('./waler-page').then((m) => m.WalerPage),
  },
];
