import { ChangeDetectionStrategy, Component } from '@angular/core';
import { StorefrontShell } from '@seamwright/shared/ui/frame';

/** The buyers' application: its frame around the routed page. */
@Component({
  selector: 'sw-root',
  imports: [StorefrontShell],
  template: '<sw-storefront-shell />',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class App {}
