import type { Routes } from '@angular/router';

export const clientsRoutes: Routes = [
  {
    path: '',
    title: 'Clients and keys',
    loadComponent: () => import('./clients-page').then((m) => m.ClientsPage),
  },
  {
    path: ':id',
    title: 'Client',
    loadComponent: () => import('./client-page').then((m) => m.ClientPage),
  },
];
