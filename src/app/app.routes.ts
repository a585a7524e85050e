import type { Routes } from '@angular/router';
import { mustBeSignedIn, mustBeSignedOut, mustHaveRight } from './platform/guards';

export const APP_ROUTES: Routes = [
  {
    path: 'sign-in',
    title: 'Sign in',
    canActivate: [mustBeSignedOut],
    loadComponent: () => import('./sign-in/sign-in').then((module) => module.SignIn),
  },
  {
    path: '',
    canActivate: [mustBeSignedIn],
    loadComponent: () => import('./frame/frame').then((module) => module.Frame),
    children: [
      { path: '', pathMatch: 'full', redirectTo: 'commissions' },
      {
        path: 'welcome',
        title: 'Welcome',
        loadComponent: () =>
          import('./frame/client-welcome').then((module) => module.ClientWelcome),
      },
      {
        path: 'commissions',
        title: 'Commissions',
        canActivate: [mustHaveRight('see-commissions')],
        loadChildren: () =>
          import('./commissions/commissions.routes').then((module) => module.COMMISSIONS_ROUTES),
      },
      {
        path: 'commissions/:commissionId/layout',
        title: 'Layout',
        // An open layout uses the whole width: the frame leaves its side navigation out.
        data: { wide: true },
        canActivate: [mustHaveRight('see-commissions')],
        loadChildren: () => import('./layout/layout.routes').then((module) => module.LAYOUT_ROUTES),
      },
      {
        path: '**',
        title: 'Not found',
        loadComponent: () => import('./frame/not-found').then((module) => module.NotFound),
      },
    ],
  },
];
