import type { Routes } from '@angular/router';

export const PEOPLE_ROUTES: Routes = [
  { path: '', title: 'People', loadComponent: () => import('./people-page').then((m) => m.PeoplePage) },
];
