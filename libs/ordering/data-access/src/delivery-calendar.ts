import { inject, Injectable } from '@angular/core';
import type { Observable } from 'rxjs';
import {
  addZone,
  changeZone,
  getCalendar,
  listSiteZones,
  removeClosure,
  setClosure,
  setSiteZone,
  type ClosureWire,
  type DeliveryZoneWire,
  type SiteZoneWire,
} from '@seamwright/ordering/contracts';
import type { Answer, CallInput } from '@seamwright/shared/contracts';
import { ApiClient } from '@seamwright/shared/data-access';

export type CalendarAnswer = Answer<typeof getCalendar>;
export type ZoneFields = CallInput<typeof addZone>['body'];

/** The administrator's calendar: forms that are sent once, and keep nothing. */
@Injectable({ providedIn: 'root' })
export class DeliveryCalendar {
  readonly #api = inject(ApiClient);

  read(): Observable<CalendarAnswer> {
    return this.#api.call(getCalendar, {});
  }

  /** The same key is sent again when the same zone is added again. */
  addZone(body: ZoneFields, idempotencyKey: string): Observable<DeliveryZoneWire> {
    return this.#api.call(addZone, { body, idempotencyKey });
  }

  changeZone({ id: zoneId, rowVersion }: DeliveryZoneWire, body: ZoneFields): Observable<DeliveryZoneWire> {
    return this.#api.call(changeZone, { params: { zoneId }, body, ifMatch: rowVersion });
  }

  close(day: string, reason: string): Observable<ClosureWire> {
    return this.#api.call(setClosure, { params: { day }, body: { reason } });
  }

  open(day: string): Observable<undefined> {
    return this.#api.call(removeClosure, { params: { day } });
  }

  sites(customerId: string): Observable<{ items: SiteZoneWire[] }> {
    return this.#api.call(listSiteZones, { query: { customerId } });
  }

  putIntoZone(customerId: string, { siteId, rowVersion }: SiteZoneWire, zoneId: string): Observable<SiteZoneWire> {
    return this.#api.call(setSiteZone, { params: { customerId, siteId }, body: { zoneId }, ifMatch: rowVersion });
  }
}
