import { inject } from '@angular/core';
import { Router, type CanActivateFn, type RedirectFunction } from '@angular/router';
import type { Action } from '../../domain/access/policy';
import { HOME } from './navigation';
import { SessionStore } from './session';

/** Only for people signed in; others go to sign in and come back. */
export const signedIn: CanActivateFn = (_route, state) =>
  inject(SessionStore).user() !== null ||
  inject(Router).createUrlTree(['/sign-in'], { queryParams: { then: state.url } });

/** Only for those whom the access policy allows the action. */
export const allowed =
  (action: Action): CanActivateFn =>
  (route, state) => {
    const session = inject(SessionStore);
    if (session.user() === null) return signedIn(route, state);
    return session.can(action) || inject(Router).createUrlTree(['/not-allowed']);
  };

/** Where the bare address leads: a clean practice names its first administrator, any other restates a price. */
export const startPage: RedirectFunction = () =>
  inject(SessionStore).session()?.needsSetup === true ? '/set-up' : '/then-and-now';

/** A clean practice names its first administrator before anything else. */
export const setUpFirst: CanActivateFn = (_route, state) =>
  inject(SessionStore).session()?.needsSetup !== true ||
  state.url.startsWith('/set-up') ||
  state.url.startsWith('/then-and-now') ||
  inject(Router).createUrlTree(['/set-up']);

/** Signing in is for those who are not. */
export const signedOut: CanActivateFn = () =>
  inject(SessionStore).user() === null || inject(Router).createUrlTree([HOME]);

/** Once there is an administrator, setting up is over. */
export const notYetSetUp: CanActivateFn = () =>
  inject(SessionStore).session()?.needsSetup === true || inject(Router).createUrlTree(['/sign-in']);
