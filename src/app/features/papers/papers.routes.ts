import type { Routes } from '@angular/router';

export const PAPERS_ROUTES: Routes = [
  {
    path: 'sets/:id/appraisal-sheet',
    title: 'Appraisal sheet',
    loadComponent: () => import('./appraisal-sheet-page').then((m) => m.AppraisalSheetPage),
  },
  {
    path: 'estimates/:id/restoration-estimate',
    title: 'Restoration estimate',
    loadComponent: () => import('./restoration-estimate-page').then((m) => m.RestorationEstimatePage),
  },
];
