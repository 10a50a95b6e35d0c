import type { Routes } from '@angular/router';

export const profilesRoutes: Routes = [
  {
    path: '',
    title: 'Profiles',
    loadComponent: () => import('./profiles-page').then((m) => m.ProfilesPage),
  },
  {
    path: ':name',
    title: 'Factor profile',
    loadComponent: () => import('./profile-page').then((m) => m.ProfilePage),
  },
];
