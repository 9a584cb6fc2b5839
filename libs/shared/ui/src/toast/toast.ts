import { inject, Injectable, Injector } from '@angular/core';

/** A short word after a deed. With an act ("Undo") it stays longer. */
export interface ToastMessage {
  readonly text: string;
  readonly act?: string;
}

/**
 * Tells in passing what was done, politely to screen readers. Material's snack bar is fetched with the first word, so
 * that shells don't carry it. Errors that need an answer belong on the page, not here.
 */
@Injectable({ providedIn: 'root' })
export class Toast {
  private readonly injector = inject(Injector);

  /** Shows the message. Resolves to true when its act was pressed, to false when it went away. */
  async show({ text, act }: ToastMessage): Promise<boolean> {
    const { MatSnackBar } = await import('@angular/material/snack-bar');
    const bar = this.injector.get(MatSnackBar).open(text, act, {
      duration: act === undefined ? 5_000 : 10_000,
      politeness: 'polite',
      horizontalPosition: 'start',
    });
    return new Promise((resolve) =>
      bar.afterDismissed().subscribe(({ dismissedByAction }) => resolve(dismissedByAction)),
    );
  }
}
