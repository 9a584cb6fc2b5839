import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  ElementRef,
  inject,
  input,
  LOCALE_ID,
  signal,
  untracked,
  viewChild,
} from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatFormField, MatLabel } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { Router } from '@angular/router';
import { Actions, ofType } from '@ngrx/effects';
import { Store } from '@ngrx/store';
import type { ReconciliationWire } from '@seamwright/accounts/contracts';
import {
  ReconciliationApiActions,
  reconciliationFeature,
  ReconciliationPageActions,
} from '@seamwright/accounts/data-access';
import { MoneySeam } from '@seamwright/accounts/ui/money-seam';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { Card, ErrorState, Icon, Loading, PageHead, Stale, Toast } from '@seamwright/shared/ui';
import { addDays, isPlantDate, plantToday } from '@seamwright/shared/util';
import { ClearingCheck } from './clearing-check';
import { exceptionRows } from './exception-rows';
import { flowOfWeek } from './flow-of-week';
import { StatementImport } from './statement-import';
import { WeekExceptions } from './week-exceptions';
import { WeekPayouts } from './week-payouts';
import { WeekTables } from './week-tables';

const PLANT_ZONE = 'Europe/London';

/** A week of card money, from the customers' cards to the bank, with what is not explained yet. */
@Component({
  selector: 'sw-reconciliation-page',
  imports: [
    Card,
    ClearingCheck,
    ErrorState,
    Icon,
    Loading,
    MatButton,
    MatFormField,
    MatInput,
    MatLabel,
    MoneySeam,
    PageHead,
    Stale,
    StatementImport,
    WeekExceptions,
    WeekPayouts,
    WeekTables,
  ],
  templateUrl: './reconciliation.page.html',
  styleUrl: './reconciliation.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReconciliationPage {
  /** From the address: any day of the week. */
  readonly day = input<string>();

  private readonly store = inject(Store);
  private readonly router = inject(Router);
  private readonly toast = inject(Toast);
  private readonly locale = inject(LOCALE_ID);
  private readonly mondays = new Intl.DateTimeFormat(this.locale, { dateStyle: 'long', timeZone: 'UTC' });
  private readonly importing = viewChild<unknown, ElementRef<HTMLElement>>('importing', { read: ElementRef });

  protected readonly wanted = computed(() => {
    const day = this.day();
    return day !== undefined && isPlantDate(day) ? day : null;
  });
  protected readonly week = this.store.selectSignal(reconciliationFeature.selectWeek);
  protected readonly asking = this.store.selectSignal(reconciliationFeature.selectAsking);
  protected readonly asTable = signal(false);
  protected readonly open = signal(false);
  protected readonly currency = HOUSE_CURRENCY;
  protected readonly flow = computed(() => {
    const week = this.week().data;
    return week && flowOfWeek(week);
  });
  protected readonly moved = computed(() => {
    const flow = this.flow();
    return flow !== null && Object.values(flow).some((minor) => minor !== 0);
  });
  protected readonly rows = computed(() => {
    const week = this.week().data;
    const today = plantToday(new Date(), PLANT_ZONE);
    return week ? exceptionRows(week.exceptions, week.payouts, today, this.locale) : [];
  });

  constructor() {
    effect(() => {
      this.wanted();
      untracked(() => this.load());
    });
    inject(Actions)
      .pipe(ofType(ReconciliationApiActions.processorAnswered), takeUntilDestroyed())
      .subscribe(({ transactions, payouts }) => {
        const text =
          transactions + payouts === 0
            ? $localize`:@@reconciliation.asked.nothing:The processor has told everything already.`
            : $localize`:@@reconciliation.asked:The processor told of ${transactions}:movements: movements and ${payouts}:payouts: payouts.`;
        void this.toast.show({ text });
      });
  }

  protected load(): void {
    this.store.dispatch(ReconciliationPageActions.opened({ day: this.wanted() }));
  }

  protected headingOf({ from }: ReconciliationWire): string {
    // Every week begins on a Monday, so that need not be said.
    const day = isPlantDate(from) ? this.mondays.format(new Date(`${from}T00:00:00Z`)) : from;
    return $localize`:@@reconciliation.heading:Week of ${day}:monday:`;
  }

  protected subOf({ exceptions }: ReconciliationWire): string {
    const count = exceptions.length;
    if (count === 0) return $localize`:@@reconciliation.sub.none:Every penny is explained or not due yet`;
    return count === 1
      ? $localize`:@@reconciliation.sub.one:One thing is not explained yet`
      : $localize`:@@reconciliation.sub.more:${count}:count: things are not explained yet`;
  }

  /** The week before or after the one shown. */
  protected goBy({ from }: ReconciliationWire, weeks: number): void {
    if (isPlantDate(from)) this.goTo(addDays(from, 7 * weeks));
  }

  protected goTo(day: string): void {
    void this.router.navigate(['/reconciliation'], { queryParams: { day: isPlantDate(day) ? day : null } });
  }

  protected ask(): void {
    this.store.dispatch(ReconciliationPageActions.processorAsked());
  }

  protected showImport(): void {
    this.open.set(true);
    // The panel is drawn a turn later.
    setTimeout(() => {
      const panel = this.importing()?.nativeElement;
      panel?.scrollIntoView({ block: 'center' });
      panel?.querySelector<HTMLElement>('input')?.focus();
    });
  }

  protected statementTaken(): void {
    this.store.dispatch(ReconciliationPageActions.statementTaken());
  }
}
