import { DOCUMENT } from '@angular/common';
import {
  afterNextRender,
  type EnvironmentProviders,
  inject,
  Injector,
  provideEnvironmentInitializer,
} from '@angular/core';
import { NavigationEnd, Router } from '@angular/router';
import { filter, map, pairwise } from 'rxjs';

/**
 * After a navigation to another page, puts focus on its first heading, so that screen readers say where one is and the
 * Tab key begins there. A changed query, fragment or first visit moves nothing.
 */
export function provideHeadingFocus(): EnvironmentProviders {
  return provideEnvironmentInitializer(() => {
    const document = inject(DOCUMENT);
    const injector = inject(Injector);
    inject(Router)
      .events.pipe(
        filter((event) => event instanceof NavigationEnd),
        map((event) => event.urlAfterRedirects.replace(/[?#].*$/, '')),
        pairwise(),
        filter(([from, to]) => from !== to),
      )
      .subscribe(() => afterNextRender({ read: () => focusHeading(document) }, { injector }));
  });
}

function focusHeading(document: Document): void {
  const heading = document.querySelector<HTMLElement>('main h1');
  heading?.setAttribute('tabindex', '-1');
  (heading ?? document.querySelector<HTMLElement>('main'))?.focus({ preventScroll: true });
}
