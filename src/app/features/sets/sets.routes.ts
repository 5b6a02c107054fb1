import type { Routes } from '@angular/router';
import { allowed } from '../../core/guards';
import { keepUnsaved } from '../../core/unsaved';

export const SETS_ROUTES: Routes = [
  { path: '', title: 'Sets', loadComponent: () => import('./sets-list-page').then((m) => m.SetsListPage) },
  {
    path: 'new',
    title: 'Register a set',
    canActivate: [allowed('set.edit')],
    canDeactivate: [keepUnsaved],
    loadComponent: () => import('./set-form-page').then((m) => m.SetFormPage),
  },
  {
    path: ':id/edit',
    title: 'Edit set',
    canActivate: [allowed('set.edit')],
    canDeactivate: [keepUnsaved],
    loadComponent: () => import('./set-form-page').then((m) => m.SetFormPage),
  },
  {
    path: ':id',
    title: 'Set',
    loadComponent: () => import('./set-page').then((m) => m.SetPage),
    children: [
      { path: '', pathMatch: 'full', loadComponent: () => import('./set-overview').then((m) => m.SetOverview) },
      { path: 'condition', loadComponent: () => import('./set-condition').then((m) => m.SetCondition) },
      { path: 'worth', loadComponent: () => import('./set-worth').then((m) => m.SetWorth) },
      { path: 'photos', loadComponent: () => import('./set-photos').then((m) => m.SetPhotos) },
    ],
  },
];
