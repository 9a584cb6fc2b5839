import { ChangeDetectionStrategy, Component, computed, inject, LOCALE_ID, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Store } from '@ngrx/store';
import { selectRoles } from '@seamwright/identity/data-access';
import { listSiteZones, type DeliveryZoneWire } from '@seamwright/ordering/contracts';
import { DeliveryCalendar, type CalendarAnswer, type ZoneFields } from '@seamwright/ordering/data-access';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { asProblem, failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import { Card, Empty, ErrorState, Loading, MoneyPipe, PageHead, Stale, type FieldProblem } from '@seamwright/shared/ui';
import { newId } from '@seamwright/shared/util';
import { Closures } from './closures';
import { SiteZones } from './site-zones';
import { weekdayNames } from './weekdays';
import { ZoneForm } from './zone-form';

/** Delivery zones with their weekdays and cut-offs, closures, and which zone each site is in. */
@Component({
  selector: 'sw-calendar-page',
  imports: [Card, Closures, Empty, ErrorState, Loading, MatButton, MoneyPipe, PageHead, SiteZones, Stale, ZoneForm],
  templateUrl: './calendar.page.html',
  styleUrl: './calendar.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CalendarPage {
  private readonly api = inject(DeliveryCalendar);
  private readonly roles = inject(Store).selectSignal(selectRoles);
  private readonly names = weekdayNames(inject(LOCALE_ID));

  protected readonly calendar = signal<Remote<CalendarAnswer>>(idle());
  /** The zone that is being changed; 'new' for one that is added. */
  protected readonly editing = signal<string | null>(null);
  protected readonly running = signal(false);
  protected readonly stale = signal(false);
  protected readonly problems = signal<readonly FieldProblem[]>([]);
  protected readonly mayEdit = computed(() => this.roles().includes('admin'));
  protected readonly maySeeSites = computed(
    () =>
      listSiteZones.access.who === 'roles' && listSiteZones.access.roles.some((role) => this.roles().includes(role)),
  );
  protected readonly currency = HOUSE_CURRENCY;
  private key = newId();

  constructor() {
    this.load();
  }

  protected load(): void {
    this.calendar.update(loading);
    this.stale.set(false);
    this.api.read().subscribe({
      next: (answer) => this.calendar.set(loaded(answer)),
      error: (error: unknown) => this.calendar.update((before) => failed(before, asProblem(error))),
    });
  }

  protected daysOf({ weekdays }: DeliveryZoneWire): string {
    return this.names
      .filter(({ day }) => weekdays.includes(day))
      .map(({ name }) => name)
      .join(', ');
  }

  protected edit(what: string | null): void {
    this.editing.set(what);
    this.problems.set([]);
    this.stale.set(false);
    this.key = newId();
  }

  protected save(zone: DeliveryZoneWire | null, fields: ZoneFields): void {
    this.running.set(true);
    this.problems.set([]);
    const saving = zone === null ? this.api.addZone(fields, this.key) : this.api.changeZone(zone, fields);
    saving.subscribe({
      next: () => {
        this.running.set(false);
        this.edit(null);
        this.load();
      },
      error: (error: unknown) => {
        this.running.set(false);
        const { code, detail, errors } = asProblem(error);
        // What was sent is settled as refused: mended, it is another deed.
        this.key = newId();
        this.stale.set(code === 'stale');
        this.problems.set(errors.length > 0 ? errors : [{ pointer: '', message: detail }]);
      },
    });
  }
}
