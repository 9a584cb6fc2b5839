import { inject, Injectable, Injector } from '@angular/core';

/** A question before a deed that can't be undone: what will happen, and the deed's own verb on the button. */
export interface ConfirmQuestion {
  readonly heading: string;
  readonly text: string;
  /** The verb: "Cancel the order", never "OK". */
  readonly act: string;
  /** The way back; "Keep it" says more than "Cancel". */
  readonly back?: string;
  /** Whether the deed destroys something. */
  readonly destructive?: boolean;
}

/** Asks before a deed. The dialog's code is fetched with the first question. */
@Injectable({ providedIn: 'root' })
export class Confirm {
  private readonly injector = inject(Injector);

  /** Resolves to true only when the act was pressed; Escape and a press outside mean no. */
  async ask(question: ConfirmQuestion): Promise<boolean> {
    const [{ MatDialog }, { ConfirmDialog }] = await Promise.all([
      import('@angular/material/dialog'),
      import('./confirm.dialog'),
    ]);
    const dialog = this.injector
      .get(MatDialog)
      .open<InstanceType<typeof ConfirmDialog>, ConfirmQuestion, boolean>(ConfirmDialog, {
        data: question,
        role: 'alertdialog',
        maxWidth: '480px',
        ariaDescribedBy: 'sw-confirm-text',
      });
    return new Promise((resolve) => dialog.afterClosed().subscribe((answer) => resolve(answer === true)));
  }
}
