import type { Routes } from '@angular/router';
import { keepUnsaved } from '../../core/unsaved';

export const ESTIMATES_ROUTES: Routes = [
  {
    path: '',
    title: 'Estimates',
    loadComponent: () => import('./estimates-list-page').then((m) => m.EstimatesListPage),
  },
  {
    path: ':id',
    title: 'Estimate',
    canDeactivate: [keepUnsaved],
    loadComponent: () => import('./estimate-page').then((m) => m.EstimatePage),
  },
];
