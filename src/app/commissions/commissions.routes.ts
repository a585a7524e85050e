import type { Routes } from '@angular/router';

export const COMMISSIONS_ROUTES: Routes = [
  {
    path: '',
    pathMatch: 'full',
    loadComponent: () => import('./commissions-page').then((module) => module.CommissionsPage),
  },
];
