import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { RouterLink } from '@angular/router';
import { Store } from '@ngrx/store';
import { selectPerson, selectRoles } from '@seamwright/identity/data-access/session';
import { PageHead } from '@seamwright/shared/ui';
import { placesOf } from './places';

/** Where staff begin: the places of their roles. */
@Component({
  imports: [PageHead, RouterLink],
  templateUrl: './home.page.html',
  styleUrl: './home.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HomePage {
  readonly #store = inject(Store);
  readonly #roles = this.#store.selectSignal(selectRoles);

  protected readonly places = computed(() => placesOf(this.#roles()));
  protected readonly heading = computed(() => {
    const name = this.#store.selectSignal(selectPerson)()?.name.split(' ')[0] ?? '';
    return $localize`:@@admin.home.heading:Good day, ${name}:name:`;
  });
}
