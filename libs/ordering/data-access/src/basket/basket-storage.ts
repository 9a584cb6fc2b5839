import { Injectable } from '@angular/core';
import { newId } from '@seamwright/shared/util';
import { filter, fromEvent, map, startWith, switchMap, type Observable } from 'rxjs';
import { emptyDraft, type BasketDraft } from './basket-draft';

const keyOf = (owner: string): string => `seamwright-basket:${owner}`;

/** Keeps each person's basket on the device. Where nothing can be kept (private windows), the basket lasts as long as the page. */
@Injectable({ providedIn: 'root' })
export class BasketStorage {
  /** The kept basket; an empty one when there is none, or when what stands there is not a basket. */
  async read(owner: string): Promise<BasketDraft> {
    const kept = textOf(owner);
    return (kept === null ? null : await checked(kept)) ?? emptyDraft(newId());
  }

  write(owner: string, draft: BasketDraft): void {
    try {
      const text = JSON.stringify(draft);
      if (localStorage.getItem(keyOf(owner)) !== text) localStorage.setItem(keyOf(owner), text);
    } catch {
      // A full or closed store must not stop the buyer from going on.
    }
  }

  /** The kept basket, and the newer ones that other tabs of the browser make of it. */
  baskets(owner: string): Observable<BasketDraft> {
    return fromEvent<StorageEvent>(window, 'storage').pipe(
      filter(({ key }) => key === keyOf(owner)),
      map(() => owner),
      startWith(owner),
      switchMap((whose) => this.read(whose)),
    );
  }
}

function textOf(owner: string): string | null {
  try {
    return localStorage.getItem(keyOf(owner));
  } catch {
    return null;
  }
}

/**
 * What stands in a text, if it is a basket. The shape is loaded when a basket is first read: the storefront's first load
 * has no use for it.
 */
async function checked(text: string): Promise<BasketDraft | null> {
  const { basketDraft } = await import('./basket-draft.shape');
  try {
    return basketDraft.safeParse(JSON.parse(text)).data ?? null;
  } catch {
    // What can't be read is no basket.
    return null;
  }
}
