import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { takeUntilDestroyed, toObservable, toSignal } from '@angular/core/rxjs-interop';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatAutocomplete, MatAutocompleteTrigger, MatOption } from '@angular/material/autocomplete';
import { MatButton } from '@angular/material/button';
import { MatFormField, MatHint, MatLabel } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatSelect } from '@angular/material/select';
import { Router, RouterLink } from '@angular/router';
import { catchError, combineLatest, debounceTime, EMPTY, map, of, switchMap, tap, type Observable } from 'rxjs';
import type { SpecificationCard } from '@seamwright/catalogue/contracts';
import type { CustomerView } from '@seamwright/identity/contracts';
import type { NewOrderWire } from '@seamwright/ordering/contracts';
import { DeliveryDays, OrderPlacing } from '@seamwright/ordering/data-access';
import { DELIVERY_TAX, GOODS_TAX, orderTotals } from '@seamwright/ordering/domain';
import { DeliveryDayPicker, OrderTotalsBox } from '@seamwright/ordering/ui';
import { PriceChecks, type PricedLine } from '@seamwright/pricing/data-access';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import type { Problem } from '@seamwright/shared/contracts';
import { asProblem } from '@seamwright/shared/data-access';
import { Card, Empty, ErrorState, PageHead } from '@seamwright/shared/ui';
import { newId } from '@seamwright/shared/util';
import { lineToSend, phoneLine, PhoneOrderLine, type PhoneLine } from './phone-order-line';
import { PhoneOrderPickers } from './phone-order-pickers';

/** How long one may pause while typing before the server is asked. */
const PAUSE_MS = 250;

/** The desk takes an order by phone: for whom, where to, when, and what. It goes on the customer's account. */
@Component({
  selector: 'sw-phone-order-page',
  imports: [
    Card,
    DeliveryDayPicker,
    Empty,
    ErrorState,
    MatAutocomplete,
    MatAutocompleteTrigger,
    MatButton,
    MatFormField,
    MatHint,
    MatInput,
    MatLabel,
    MatOption,
    MatSelect,
    OrderTotalsBox,
    PageHead,
    PhoneOrderLine,
    ReactiveFormsModule,
    RouterLink,
  ],
  templateUrl: './phone-order.page.html',
  styleUrl: './phone-order.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PhoneOrderPage {
  private readonly pickers = inject(PhoneOrderPickers);
  private readonly deliveryDays = inject(DeliveryDays);
  private readonly priceChecks = inject(PriceChecks);
  private readonly placing = inject(OrderPlacing);
  private readonly router = inject(Router);

  /** The picked one, or what is typed while none is. */
  protected readonly customerField = new FormControl<CustomerView | string>('', { nonNullable: true });
  protected readonly searchField = new FormControl<SpecificationCard | string>('', { nonNullable: true });
  protected readonly customer = toSignal(
    this.customerField.valueChanges.pipe(map((picked) => (typeof picked === 'string' ? null : picked))),
    { initialValue: null },
  );
  protected readonly pickedSiteId = signal<string | null>(null);
  protected readonly pickedDay = signal<string | null>(null);
  protected readonly lines = signal<readonly PhoneLine[]>([]);
  protected readonly reference = signal('');
  protected readonly running = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly currency = HOUSE_CURRENCY;
  protected readonly crumbs = [{ label: $localize`:@@phoneOrder.crumb:Orders`, path: '/orders' }];

  protected readonly customers = toSignal(
    this.customerField.valueChanges.pipe(
      debounceTime(PAUSE_MS),
      switchMap((typed) =>
        typeof typed === 'string'
          ? this.pickers.customers(typed).pipe(this.orTell<readonly CustomerView[]>([]))
          : EMPTY,
      ),
    ),
    { initialValue: [] },
  );
  protected readonly specifications = toSignal(
    this.searchField.valueChanges.pipe(
      debounceTime(PAUSE_MS),
      switchMap((typed) =>
        typeof typed === 'string' && typed.trim() !== ''
          ? this.pickers.specifications(typed.trim()).pipe(this.orTell<readonly SpecificationCard[]>([]))
          : of([]),
      ),
    ),
    { initialValue: [] },
  );
  protected readonly days = toSignal(
    combineLatest([toObservable(this.customer), toObservable(this.pickedSiteId)]).pipe(
      switchMap(([customer, siteId]) =>
        customer === null
          ? of(null)
          : this.deliveryDays
              .next({ customerId: customer.id, ...(siteId === null ? {} : { siteId }) })
              .pipe(this.orTell(null)),
      ),
    ),
    { initialValue: null },
  );
  protected readonly siteId = computed(() => this.pickedSiteId() ?? this.days()?.siteId ?? null);
  protected readonly day = computed(() => {
    const open = this.days()?.days.filter(({ closed }) => !closed) ?? [];
    return (open.find(({ day }) => day === this.pickedDay()) ?? open[0])?.day ?? null;
  });
  /** What the desk says of each line, by its id. */
  protected readonly prices = toSignal(
    combineLatest([toObservable(this.customer), toObservable(this.day), toObservable(this.lines)]).pipe(
      debounceTime(PAUSE_MS),
      switchMap(([customer, deliveryDay, lines]) => this.pricesOf(customer, deliveryDay, lines)),
    ),
    { initialValue: new Map<string, PricedLine>() },
  );
  protected readonly totals = computed(() => {
    const lines = this.lines();
    const priced = lines.flatMap(({ id }) => {
      const answer = this.prices().get(id);
      return answer?.ok ? [{ ...answer.amounts, taxPpm: GOODS_TAX }] : [];
    });
    const days = this.days();
    return days && priced.length > 0 && priced.length === lines.length
      ? orderTotals(priced, days.deliveryChargeMinor, DELIVERY_TAX)
      : null;
  });
  protected readonly order = computed<NewOrderWire | null>(() => {
    const [customer, siteId, deliveryDay] = [this.customer(), this.siteId(), this.day()];
    const lines = this.lines().flatMap((line) => lineToSend(line) ?? []);
    if (customer === null || siteId === null || deliveryDay === null) return null;
    if (lines.length === 0 || lines.length < this.lines().length || this.totals() === null) return null;
    const customerReference = this.reference().trim();
    return { customerId: customer.id, siteId, deliveryDay, settlement: 'account', customerReference, lines };
  });

  /** One key for one order: it changes with what is ordered, not with how often it is sent. */
  private sent: { readonly text: string; readonly key: string } = { text: '', key: '' };

  constructor() {
    // Another customer has other sites and days.
    this.customerField.valueChanges.pipe(takeUntilDestroyed()).subscribe(() => {
      this.pickedSiteId.set(null);
      this.pickedDay.set(null);
    });
  }

  protected readonly customerText = (picked: CustomerView | string): string =>
    typeof picked === 'string' ? picked : picked.name;
  protected readonly searchText = (picked: SpecificationCard | string): string =>
    typeof picked === 'string' ? picked : '';

  protected add(card: SpecificationCard): void {
    this.searchField.setValue('');
    this.pickers
      .specification(card.code)
      .pipe(this.orTell(null))
      .subscribe((specification) => {
        if (specification) this.lines.update((lines) => [...lines, phoneLine(newId(), specification)]);
      });
  }

  protected replace(line: PhoneLine): void {
    this.lines.update((lines) => lines.map((each) => (each.id === line.id ? line : each)));
  }

  protected takeOff({ id }: PhoneLine): void {
    this.lines.update((lines) => lines.filter((each) => each.id !== id));
  }

  protected place(): void {
    const order = this.order();
    if (order === null || this.running()) return;
    const text = JSON.stringify(order);
    if (this.sent.text !== text) this.sent = { text, key: newId() };
    this.running.set(true);
    this.problem.set(null);
    this.placing.place(order, this.sent.key).subscribe({
      next: ({ id }) => void this.router.navigate(['/orders', id]),
      error: (error: unknown) => {
        this.running.set(false);
        this.problem.set(this.named(asProblem(error)));
      },
    });
  }

  /** Says of which line the server speaks. */
  private named(problem: Problem): Problem {
    const errors = problem.errors.map(({ pointer, message }) => {
      const line = this.lines()[Number(/^\/lines\/(\d+)/.exec(pointer)?.[1] ?? NaN)];
      return { pointer, message: line ? `${line.specification.name}: ${message}` : message };
    });
    return { ...problem, errors };
  }

  private pricesOf(customer: CustomerView | null, deliveryDay: string | null, lines: readonly PhoneLine[]) {
    const none = new Map<string, PricedLine>();
    const asked = lines.flatMap((line) => {
      const sent = lineToSend(line);
      if (sent === null) return [];
      const { specificationId, chosen, quantity } = sent;
      return [{ id: line.id, ask: { specificationId, chosen, quantity } }];
    });
    if (customer === null || deliveryDay === null || asked.length === 0) return of(none);
    return this.priceChecks.check({ customerId: customer.id, deliveryDay, lines: asked.map(({ ask }) => ask) }).pipe(
      tap(() => this.problem.set(null)),
      map((answer) => new Map(answer.lines.flatMap((line, at) => (asked[at] ? [[asked[at].id, line] as const] : [])))),
      this.orTell(none),
    );
  }

  private orTell<Instead>(instead: Instead) {
    return <T>(asking: Observable<T>): Observable<T | Instead> =>
      asking.pipe(
        catchError((error: unknown) => {
          this.problem.set(asProblem(error));
          return of(instead);
        }),
      );
  }
}
