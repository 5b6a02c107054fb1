import { inject } from '@angular/core';
import type { CanDeactivateFn } from '@angular/router';
import { Confirm } from '../ui/confirm';

/** A page that may hold what is typed and not saved. */
export interface HoldsUnsaved {
  hasUnsaved(): boolean;
}

/** Asks before leaving a page with unsaved typing. */
export const keepUnsaved: CanDeactivateFn<HoldsUnsaved> = (page) =>
  !page.hasUnsaved() ||
  inject(Confirm).ask({
    title: 'Leave without saving?',
    text: 'What you typed on this page is not saved yet.',
    action: 'Leave without saving',
    keep: 'Stay here',
  });
