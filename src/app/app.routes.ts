import type { Routes } from '@angular/router';
import { allowed, notYetSetUp, setUpFirst, signedIn, signedOut, startPage } from './core/guards';

export const APP_ROUTES: Routes = [
  {
    path: '',
    canActivateChild: [setUpFirst],
    children: [
      { path: '', pathMatch: 'full', redirectTo: startPage },
      {
        path: 'then-and-now',
        loadChildren: () => import('./features/then-and-now/then-and-now.routes').then((m) => m.THEN_AND_NOW_ROUTES),
      },
      {
        path: 'sets',
        canActivate: [allowed('set.view')],
        loadChildren: () => import('./features/sets/sets.routes').then((m) => m.SETS_ROUTES),
      },
      {
        path: 'estimates',
        canActivate: [allowed('estimate.view')],
        loadChildren: () => import('./features/estimates/estimates.routes').then((m) => m.ESTIMATES_ROUTES),
      },
      {
        path: 'papers',
        canActivate: [allowed('paper.view')],
        loadChildren: () => import('./features/papers/papers.routes').then((m) => m.PAPERS_ROUTES),
      },
      {
        path: 'people',
        canActivate: [allowed('user.manage')],
        loadChildren: () => import('./features/people/people.routes').then((m) => m.PEOPLE_ROUTES),
      },
      {
        path: 'practice',
        canActivate: [allowed('practice.edit')],
        loadChildren: () => import('./features/practice/practice.routes').then((m) => m.PRACTICE_ROUTES),
      },
      {
        path: 'account',
        canActivate: [signedIn],
        title: 'Account',
        loadComponent: () => import('./features/account/account-page').then((m) => m.AccountPage),
      },
      {
        path: 'sign-in',
        canActivate: [signedOut],
        title: 'Sign in',
        loadComponent: () => import('./features/account/sign-in-page').then((m) => m.SignInPage),
      },
      {
        path: 'set-up',
        canActivate: [notYetSetUp],
        title: 'Set up the practice',
        loadComponent: () => import('./features/account/set-up-page').then((m) => m.SetUpPage),
      },
      {
        path: 'invitation/:token',
        title: 'Invitation',
        loadComponent: () => import('./features/account/invitation-page').then((m) => m.InvitationPage),
      },
      {
        path: 'not-allowed',
        title: 'Not allowed',
        loadComponent: () => import('./core/dead-end-page').then((m) => m.NotAllowedPage),
      },
      {
        path: '**',
        title: 'Nothing here',
        loadComponent: () => import('./core/dead-end-page').then((m) => m.NotFoundPage),
      },
    ],
  },
];
