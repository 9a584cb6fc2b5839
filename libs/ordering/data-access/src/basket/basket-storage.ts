import { Injectable } from '@angular/core';
import { newId } from '@seamwright/shared/util';
import { filter, fromEvent, map, type Observable } from 'rxjs';
import { basketDraft, emptyDraft, type BasketDraft } from './basket-draft';

const keyOf = (owner: string): string => `seamwright-basket:${owner}`;

/** Keeps each person's basket on the device. Where nothing can be kept (private windows), the basket lasts as long as the page. */
@Injectable({ providedIn: 'root' })
export class BasketStorage {
  /** The kept basket; an empty one when there is none, or when what stands there is not a basket. */
  read(owner: string): BasketDraft {
    try {
      const kept = basketDraft.safeParse(JSON.parse(localStorage.getItem(keyOf(owner)) ?? 'null'));
      if (kept.success) return kept.data;
    } catch {
      // What can't be read is no basket.
    }
    return emptyDraft(newId());
  }

  write(owner: string, draft: BasketDraft): void {
    try {
      const text = JSON.stringify(draft);
      if (localStorage.getItem(keyOf(owner)) !== text) localStorage.setItem(keyOf(owner), text);
    } catch {
      // A full or closed store must not stop the buyer from going on.
    }
  }

  /** Tells when another tab of the browser changed the person's basket. */
  changesElsewhere(owner: string): Observable<BasketDraft> {
    return fromEvent<StorageEvent>(window, 'storage').pipe(
      filter(({ key }) => key === keyOf(owner)),
      map(() => this.read(owner)),
    );
  }
}
