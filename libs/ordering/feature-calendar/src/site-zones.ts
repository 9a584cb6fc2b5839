import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatAutocomplete, MatAutocompleteTrigger, MatOption } from '@angular/material/autocomplete';
import { MatFormField, MatLabel } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatSelect } from '@angular/material/select';
import { catchError, debounceTime, EMPTY, map, of, switchMap } from 'rxjs';
import type { CustomerView } from '@seamwright/identity/contracts';
import { CustomersApi } from '@seamwright/identity/data-access';
import type { DeliveryZoneWire, SiteZoneWire } from '@seamwright/ordering/contracts';
import { DeliveryCalendar } from '@seamwright/ordering/data-access';
import type { Problem } from '@seamwright/shared/contracts';
import { asProblem } from '@seamwright/shared/data-access';
import { ErrorState, Toast } from '@seamwright/shared/ui';

const PAUSE_MS = 250;

/** The sites of a customer and the zone that each is delivered in. */
@Component({
  selector: 'sw-site-zones',
  imports: [
    ErrorState,
    MatAutocomplete,
    MatAutocompleteTrigger,
    MatFormField,
    MatInput,
    MatLabel,
    MatOption,
    MatSelect,
    ReactiveFormsModule,
  ],
  templateUrl: './site-zones.html',
  styleUrl: './site-zones.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SiteZones {
  readonly zones = input.required<readonly DeliveryZoneWire[]>();
  readonly mayEdit = input.required<boolean>();

  private readonly calendar = inject(DeliveryCalendar);
  private readonly customersApi = inject(CustomersApi);
  private readonly toast = inject(Toast);

  protected readonly customer = signal<CustomerView | null>(null);
  protected readonly sites = signal<readonly SiteZoneWire[]>([]);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly field = new FormControl<CustomerView | string>('', { nonNullable: true });
  protected readonly customers = toSignal(
    this.field.valueChanges.pipe(
      debounceTime(PAUSE_MS),
      switchMap((typed) =>
        typeof typed === 'string'
          ? this.customersApi.list({ q: typed, limit: 8 }).pipe(
              map(({ items }) => items),
              catchError((error: unknown) => {
                this.problem.set(asProblem(error));
                return of<CustomerView[]>([]);
              }),
            )
          : EMPTY,
      ),
    ),
    { initialValue: [] },
  );

  protected readonly textOf = (picked: CustomerView | string): string =>
    typeof picked === 'string' ? picked : picked.name;

  protected pick(customer: CustomerView): void {
    this.customer.set(customer);
    this.load(customer);
  }

  protected put(site: SiteZoneWire, zoneId: string): void {
    const customer = this.customer();
    if (customer === null || zoneId === site.zoneId) return;
    this.problem.set(null);
    this.calendar.putIntoZone(customer.id, site, zoneId).subscribe({
      next: (changed) => {
        this.sites.update((sites) => sites.map((each) => (each.siteId === changed.siteId ? changed : each)));
        void this.toast.show({ text: $localize`:@@siteZones.saved:${changed.siteName}:site: is put into its zone.` });
      },
      error: (error: unknown) => {
        this.problem.set(asProblem(error));
        this.load(customer);
      },
    });
  }

  private load(customer: CustomerView): void {
    this.calendar.sites(customer.id).subscribe({
      next: ({ items }) => this.sites.set(items),
      error: (error: unknown) => this.problem.set(asProblem(error)),
    });
  }
}
