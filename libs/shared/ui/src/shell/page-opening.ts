import { computed, inject, type Signal } from '@angular/core';
import { Router } from '@angular/router';

/** Whether a page is on its way: from the start of the application, or of a navigation, until it is drawn. */
export function pageOpening(): Signal<boolean> {
  const router = inject(Router);
  return computed(() => router.currentNavigation() !== null || router.lastSuccessfulNavigation() === null);
}
