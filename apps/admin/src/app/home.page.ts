import { ChangeDetectionStrategy, Component } from '@angular/core';
import { PageHead } from '@seamwright/shared/ui';

/** Where a member of staff begins. */
@Component({
  imports: [PageHead],
  templateUrl: './home.page.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HomePage {}
