import { inject } from '@angular/core';
import type { CanDeactivateFn } from '@angular/router';
import { Confirm } from '../../ui/confirm';

/** A page that may hold what is not yet saved. */
export interface MayBeUnsaved {
  unsaved(): boolean;
}

/** Asks before a page is left with something unsaved on it. */
export const keepUnsaved: CanDeactivateFn<MayBeUnsaved> = (page) =>
  !page.unsaved() ||
  inject(Confirm).ask({
    title: 'Leave without saving?',
    text: 'What you typed on this page is not saved and will be lost.',
    action: 'Leave',
  });
