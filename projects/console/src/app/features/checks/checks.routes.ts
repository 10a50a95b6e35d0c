import type { Routes } from '@angular/router';

export const checksRoutes: Routes = [
  { path: '', pathMatch: 'full', redirectTo: 'waler' },
  {
    path: 'waler',
    title: 'Waler check',
    loadComponent: () => import('./waler-page').then((m) => m.WalerPage),
  },
  {
    path: 'section',
    title: 'Cross-section check',
    loadComponent: () => import('./section-page').then((m) => m.SectionPage),
  },
  {
    path: 'stress',
    title: 'Stress check',
    loadComponent: () => import('./stress-page').then((m) => m.StressPage),
  },
];
