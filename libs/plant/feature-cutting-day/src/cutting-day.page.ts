import { ChangeDetectionStrategy, Component, computed, effect, inject, input, LOCALE_ID, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatTabsModule } from '@angular/material/tabs';
import { Actions, ofType } from '@ngrx/effects';
import { Store } from '@ngrx/store';
import { selectRoles } from '@seamwright/identity/data-access/session';
import { CuttingDayPageActions, CuttingDaysApiActions, cuttingDaysFeature } from '@seamwright/plant/data-access';
import { closeCuttingDay } from '@seamwright/plant/contracts';
import { minutesOf } from '@seamwright/plant/domain';
import type { Role } from '@seamwright/shared/contracts';
import {
  Card,
  Confirm,
  Empty,
  ErrorState,
  Icon,
  KgPipe,
  Loading,
  PageHead,
  SeamLine,
  Toast,
} from '@seamwright/shared/ui';
import { formatPlantDate, isPlantDate } from '@seamwright/shared/util';
import { Cautions } from './cautions';
import { CustomerCuts } from './customer-cuts';
import { CuttingTable } from './cutting-table';
import { dayStages, deedDone, deedName, deedQuestion, nextDeed } from './day-words';
import { PullTable } from './pull-table';
import { StationBars } from './station-bars';

/** Who may move a day, as its endpoint says. */
const MOVERS: readonly Role[] = closeCuttingDay.access.who === 'roles' ? closeCuttingDay.access.roles : [];

type Tab = 'cutting' | 'customers' | 'pull';

/** One cutting day: where it stands, what is cut and for whom, what is pulled, and how long it takes. */
@Component({
  imports: [
    Card,
    Cautions,
    CustomerCuts,
    CuttingTable,
    Empty,
    ErrorState,
    Icon,
    KgPipe,
    Loading,
    MatButton,
    MatTabsModule,
    PageHead,
    PullTable,
    SeamLine,
    StationBars,
  ],
  templateUrl: './cutting-day.page.html',
  styleUrl: './cutting-day.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CuttingDayPage {
  /** From the address. */
  readonly deliveryDay = input.required<string>();

  private readonly store = inject(Store);
  private readonly confirm = inject(Confirm);
  private readonly locale = inject(LOCALE_ID);

  protected readonly papers = this.store.selectSignal(cuttingDaysFeature.selectPapers);
  protected readonly deed = this.store.selectSignal(cuttingDaysFeature.selectDeed);
  protected readonly workbook = this.store.selectSignal(cuttingDaysFeature.selectWorkbook);
  protected readonly shown = signal<Tab>('cutting');
  protected readonly tabs: readonly { key: Tab; label: string }[] = [
    { key: 'cutting', label: $localize`:@@cuttingDay.tab.cutting:Cutting list` },
    { key: 'customers', label: $localize`:@@cuttingDay.tab.customers:By customer` },
    { key: 'pull', label: $localize`:@@cuttingDay.tab.pull:Pull list` },
  ];
  protected readonly crumbs = [{ label: $localize`:@@cuttingDays.heading:Cutting days`, path: '..' }];

  protected readonly day = computed(() => this.papers().data?.day ?? null);
  protected readonly stages = computed(() => {
    const day = this.day();
    return day ? dayStages(day, this.locale) : [];
  });
  protected readonly heading = computed(() => this.inWords(this.day()?.cuttingDay ?? this.deliveryDay()));
  protected readonly sub = computed(() => {
    const day = this.day();
    if (!day) return '';
    return $localize`:@@cuttingDay.sub:For delivery on ${this.inWords(day.deliveryDay)}:day: · ${day.orders}:orders: orders, ${day.lines}:lines: lines`;
  });
  private readonly roles = this.store.selectSignal(selectRoles);
  /** What comes next, for those whose deed it is. */
  protected readonly next = computed(() => {
    const day = this.day();
    const deed = day && this.roles().some((role) => MOVERS.includes(role)) ? nextDeed(day) : null;
    return deed && { deed, name: deedName(deed) };
  });
  protected readonly minutes = computed(() => minutesOf(this.papers().data?.cutting.totals.seconds ?? 0));

  constructor() {
    effect(() => this.store.dispatch(CuttingDayPageActions.opened({ deliveryDay: this.deliveryDay() })));
    const toast = inject(Toast);
    inject(Actions)
      .pipe(ofType(CuttingDaysApiActions.deedDone), takeUntilDestroyed())
      .subscribe(({ deed }) => void toast.show({ text: deedDone(deed) }));
  }

  protected refresh(): void {
    this.store.dispatch(CuttingDayPageActions.refreshPressed());
  }

  protected async move(): Promise<void> {
    const [day, next] = [this.day(), this.next()];
    if (!day || !next || !(await this.confirm.ask(deedQuestion(next.deed, day)))) return;
    const { deliveryDay, rowVersion } = day;
    this.store.dispatch(CuttingDayPageActions.deedPressed({ deed: next.deed, deliveryDay, rowVersion }));
  }

  protected save(): void {
    this.store.dispatch(CuttingDayPageActions.workbookWanted({ deliveryDay: this.deliveryDay() }));
  }

  protected print(): void {
    window.print();
  }

  private inWords(day: string): string {
    return isPlantDate(day) ? formatPlantDate(day, 'long', this.locale) : day;
  }
}
