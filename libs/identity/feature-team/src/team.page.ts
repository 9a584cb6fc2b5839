import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { Store } from '@ngrx/store';
import { PeopleEditor, selectPerson, SitesEditor } from '@seamwright/identity/data-access';
import { PeopleBoard, SitesBoard } from '@seamwright/identity/ui';
import { PageHead } from '@seamwright/shared/ui';

/** Where an account owner invites colleagues, keeps them to sites, and looks after the delivery addresses. */
@Component({
  selector: 'sw-team-page',
  imports: [PageHead, PeopleBoard, SitesBoard],
  providers: [PeopleEditor, SitesEditor],
  template: `
    <sw-page-head heading="Team and addresses" i18n-heading="@@identity.team.title" [sub]="customerName()" />
    @if (customerId(); as id) {
      <sw-people-board
        heading="Colleagues"
        i18n-heading="@@identity.team.people"
        [desk]="people"
        [customerId]="id"
        [sites]="sites.sites() ?? []"
        emptyText="Invite those who order with you."
        i18n-emptyText="@@identity.team.empty"
      />
      <sw-sites-board [desk]="sites" />
    }
  `,
  host: { class: 'sw-page sw-stack' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TeamPage {
  protected readonly people = inject(PeopleEditor);
  protected readonly sites = inject(SitesEditor);
  readonly #person = inject(Store).selectSignal(selectPerson);
  protected readonly customerId = computed(() => this.#person()?.customerId ?? null);
  protected readonly customerName = computed(() => this.#person()?.customerName ?? '');

  constructor() {
    const customerId = this.customerId();
    if (!customerId) return;
    this.people.open({ customerId });
    this.sites.open(customerId);
  }
}
