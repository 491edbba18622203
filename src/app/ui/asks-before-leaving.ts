import { inject } from '@angular/core';
import { type CanDeactivateFn } from '@angular/router';
import { Asker } from './asker';

/** A page that may hold work not yet saved. */
export interface HoldsWork {
  /** what would be lost, such as `the customer of Q-000012`, or null */
  unsaved(): string | null;
}

/** Asks before leaving a page with unsaved work. */
export const asksBeforeLeaving: CanDeactivateFn<HoldsWork> = (page) => {
  const lost = page.unsaved();
  if (lost === null) return true;
  return inject(Asker).confirm({
    title: 'Leave without saving?',
    text: `What you typed is not saved yet: ${lost}.`,
    confirm: 'Leave without saving',
    cancel: 'Stay here',
  });
};
