import type { Routes } from '@angular/router';
import { keepUnsaved } from '../../core/unsaved';

export const PRACTICE_ROUTES: Routes = [
  {
    path: '',
    title: 'Practice',
    canDeactivate: [keepUnsaved],
    loadComponent: () => import('./practice-page').then((m) => m.PracticePage),
  },
];
