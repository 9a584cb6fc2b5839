import { ChangeDetectionStrategy, Component } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { PageHead } from '@seamwright/shared/ui';

/** What is shown for an address that leads nowhere. */
@Component({
  imports: [MatButton, PageHead, RouterLink],
  templateUrl: './not-found.page.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NotFoundPage {}
