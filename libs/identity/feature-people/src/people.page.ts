import { ChangeDetectionStrategy, Component, DestroyRef, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { debounceTime, distinctUntilChanged, map } from 'rxjs';
import type { CustomerView } from '@seamwright/identity/contracts';
import { CustomersApi, PeopleEditor } from '@seamwright/identity/data-access';
import { PeopleBoard } from '@seamwright/identity/ui';
import { PageHead } from '@seamwright/shared/ui';

/** Where an administrator invites staff, gives roles, assigns customers and ends sessions. */
@Component({
  selector: 'sw-people-page',
  imports: [MatFormFieldModule, MatInput, PageHead, PeopleBoard, ReactiveFormsModule],
  providers: [PeopleEditor],
  template: `
    <sw-page-head
      heading="People and roles"
      i18n-heading="@@identity.people.title"
      sub="The staff of the house. A customer’s people stand on the customer’s page."
      i18n-sub="@@identity.people.sub"
    />
    <mat-form-field appearance="outline" floatLabel="always" class="search" subscriptSizing="dynamic">
      <mat-label i18n="@@identity.people.search">Search by name or e-mail</mat-label>
      <input matInput type="search" [formControl]="search" />
    </mat-form-field>
    <sw-people-board
      heading="Staff"
      i18n-heading="@@identity.people.staff"
      [desk]="people"
      [customerId]="null"
      [customers]="customers()"
      emptyText="Nobody of this name. Invite them, or look for another name."
      i18n-emptyText="@@identity.people.emptyText"
    />
  `,
  styles: `
    .search {
      max-inline-size: 400px;
    }
  `,
  host: { class: 'sw-page sw-stack' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PeoplePage {
  protected readonly people = inject(PeopleEditor);
  protected readonly customers = signal<readonly CustomerView[]>([]);
  protected readonly search = new FormControl('', { nonNullable: true });

  constructor() {
    const destroyed = inject(DestroyRef);
    this.people.open({ customerId: null, who: 'staff' });
    this.search.valueChanges
      .pipe(
        debounceTime(200),
        map((text) => text.trim()),
        distinctUntilChanged(),
        takeUntilDestroyed(destroyed),
      )
      .subscribe((q) => this.people.open({ customerId: null, who: 'staff', q }));
    // Only to choose a rep's customers from; without them everything else still works.
    inject(CustomersApi)
      .list({ limit: 200 })
      .pipe(takeUntilDestroyed(destroyed))
      .subscribe({ next: ({ items }) => this.customers.set(items), error: () => this.customers.set([]) });
  }
}
