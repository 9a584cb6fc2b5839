import { NgComponentOutlet } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, LOCALE_ID } from '@angular/core';
import { RouterLink } from '@angular/router';
import { Store } from '@ngrx/store';
import { selectPerson, selectRoles } from '@seamwright/identity/data-access/session';
import { PageHead } from '@seamwright/shared/ui';
import { formatPlantDate } from '@seamwright/shared/util';
import { placesOf } from '../places';
import { boardsOf } from './home-boards';
import { today } from './plant-day';

/** Where staff begin: what waits for them now, and under it the places of their roles. */
@Component({
  imports: [NgComponentOutlet, PageHead, RouterLink],
  templateUrl: './home.page.html',
  styleUrl: './home.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class HomePage {
  readonly #store = inject(Store);
  readonly #roles = this.#store.selectSignal(selectRoles);
  readonly #person = this.#store.selectSignal(selectPerson);

  protected readonly boards = computed(() => boardsOf(this.#roles()));
  protected readonly places = computed(() => placesOf(this.#roles()));
  protected readonly heading = computed(() => {
    const name = this.#person()?.name.split(' ')[0] ?? '';
    return $localize`:@@admin.home.heading:Good day, ${name}:name:`;
  });
  protected readonly sub = formatPlantDate(today(), 'long', inject(LOCALE_ID));
}
