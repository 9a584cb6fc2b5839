import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Icon } from '../icons/icon';

/** Says that what is shown may no longer be so (no connection, or changed since) and offers to fetch it anew. */
@Component({
  selector: 'sw-stale',
  imports: [Icon, MatButton],
  template: `
    <sw-icon [name]="offline() ? 'offline' : 'refresh'" />
    <p>{{ text() }}</p>
    @if (!offline()) {
      <button matButton type="button" (click)="refresh.emit()" i18n="@@ui.stale.refresh">Show what is new</button>
    }
  `,
  styleUrl: './stale.scss',
  host: { role: 'status' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Stale {
  readonly text = input.required<string>();
  readonly offline = input(false);
  readonly refresh = output();
}
