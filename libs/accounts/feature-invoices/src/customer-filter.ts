import { ChangeDetectionStrategy, Component, effect, inject, input, output, signal, untracked } from '@angular/core';
import { takeUntilDestroyed, toSignal } from '@angular/core/rxjs-interop';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatAutocompleteModule } from '@angular/material/autocomplete';
import { MatFormField, MatLabel } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { catchError, debounceTime, filter, map, of, startWith, switchMap } from 'rxjs';
import { CustomersApi } from '@seamwright/identity/data-access';

interface NamedCustomer {
  readonly id: string;
  readonly name: string;
  readonly number: number;
}

const SHOWN = 8;
const PAUSE_MS = 250;

/** Narrows a list to one customer, found by name or number; an emptied field means all. */
@Component({
  selector: 'sw-customer-filter',
  imports: [MatAutocompleteModule, MatFormField, MatInput, MatLabel, ReactiveFormsModule],
  template: `
    <mat-form-field appearance="outline" subscriptSizing="dynamic">
      <mat-label i18n="@@accounts.customerFilter">Customer</mat-label>
      <input matInput type="search" [formControl]="words" [matAutocomplete]="list" autocomplete="off" />
      <mat-autocomplete
        #list
        [displayWith]="textOf"
        autoActiveFirstOption
        (optionSelected)="chosen.emit($event.option.value.id)"
      >
        @for (customer of found(); track customer.id) {
          <mat-option [value]="customer">{{ customer.name }} · {{ '' + customer.number }}</mat-option>
        }
      </mat-autocomplete>
    </mat-form-field>
  `,
  styles: `
    mat-form-field {
      inline-size: min(320px, 100%);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CustomerFilter {
  readonly customerId = input<string | null>(null);
  readonly chosen = output<string | null>();

  private readonly customers = inject(CustomersApi);
  private readonly named = signal<NamedCustomer | null>(null);
  protected readonly words = new FormControl<string | NamedCustomer>('', { nonNullable: true });
  protected readonly textOf = (value: string | NamedCustomer): string =>
    typeof value === 'string' ? value : value.name;
  protected readonly found = toSignal(
    this.words.valueChanges.pipe(
      startWith(''),
      filter((value) => typeof value === 'string'),
      debounceTime(PAUSE_MS),
      switchMap((q) =>
        this.customers.list({ q, limit: SHOWN }).pipe(
          map(({ items }): readonly NamedCustomer[] => items),
          // Without suggestions the list stays as it is; typing on asks again.
          catchError(() => of([])),
        ),
      ),
    ),
    { initialValue: [] },
  );

  constructor() {
    this.words.valueChanges.pipe(takeUntilDestroyed()).subscribe((value) => {
      if (typeof value !== 'string') this.named.set(value);
      else if (value === '' && this.customerId() !== null) this.chosen.emit(null);
    });
    effect(() => {
      const customerId = this.customerId();
      untracked(() => this.showName(customerId));
    });
  }

  /** A customer that came with the address is shown by name. */
  private showName(customerId: string | null): void {
    if (customerId === null) this.words.setValue('', { emitEvent: false });
    else if (this.named()?.id !== customerId)
      this.customers
        .get(customerId)
        .pipe(catchError(() => of(null)))
        .subscribe((customer) => {
          if (customer && this.customerId() === customerId) this.words.setValue(customer, { emitEvent: false });
        });
  }
}
