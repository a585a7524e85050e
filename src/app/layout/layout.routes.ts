import type { CanDeactivateFn, Routes } from '@angular/router';
import type { LayoutPage } from './layout-page';

const mayLeave: CanDeactivateFn<LayoutPage> = (page) => page.mayLeave();

/** One lazy route a station; stations.ts lists the same in the order of the work. */
export const LAYOUT_ROUTES: Routes = [
  {
    path: '',
    loadComponent: () => import('./layout-page').then((module) => module.LayoutPage),
    canDeactivate: [mayLeave],
    children: [
      { path: '', pathMatch: 'full', redirectTo: 'shell' },
      {
        path: 'shell',
        title: 'Shell',
        loadComponent: () => import('./shell/shell-station').then((module) => module.ShellStation),
      },
      {
        path: 'joint',
        title: 'Joint',
        loadComponent: () => import('./joint/joint-station').then((module) => module.JointStation),
      },
      {
        path: 'pattern',
        title: 'Pattern',
        loadComponent: () =>
          import('./pattern/pattern-station').then((module) => module.PatternStation),
      },
      {
        path: 'cutting',
        title: 'Cutting',
        loadComponent: () =>
          import('./cutting/cutting-station').then((module) => module.CuttingStation),
      },
      {
        path: 'review',
        title: 'Review',
        loadComponent: () =>
          import('./review/review-station').then((module) => module.ReviewStation),
      },
    ],
  },
];
