import { Directive } from '@angular/core';

/** A link or button in a panel of the bar, as wide as the panel and high enough for a thumb. */
@Directive({
  selector: 'a[swMenuItem], button[swMenuItem]',
  host: { class: 'sw-menu-item' },
})
export class MenuItem {}
