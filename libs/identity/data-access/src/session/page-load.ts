import { DOCUMENT, Location } from '@angular/common';
import { inject, Injectable } from '@angular/core';

/** Loads a page anew, so that nothing of the person before is left in memory. */
@Injectable({ providedIn: 'root' })
export class PageLoad {
  readonly #location = inject(Location);
  readonly #document = inject(DOCUMENT);

  /** An address inside this application: "/sign-in". */
  inside(address: string): void {
    this.outside(this.#location.prepareExternalUrl(address));
  }

  outside(address: string): void {
    this.#document.location.assign(address);
  }
}
