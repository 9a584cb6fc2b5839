import { ChangeDetectionStrategy, Component } from '@angular/core';
import { AdminShell } from '@seamwright/shared/ui/frame';

/** The desk's application: its frame around the routed page. */
@Component({
  selector: 'sw-root',
  imports: [AdminShell],
  template: '<sw-admin-shell />',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class App {}
