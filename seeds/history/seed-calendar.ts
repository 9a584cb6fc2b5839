import type { Caller } from '@seamwright/shared/server';
import { addZone, setSiteZone } from '@seamwright/ordering/contracts';
import type { Desk } from '../desk';
import type { SeededPeople } from '../people/seed-people';
import { ZONES } from '../scenario/calendar';
import { CUSTOMERS } from '../scenario/customers';

/** Sets up the delivery zones and puts every site into its own. */
export async function seedCalendar(desk: Desk, admin: Caller, { customers, sites }: SeededPeople): Promise<void> {
  const zoneIds = new Map<string, string>();
  for (const [key, { weekdays, ...zone }] of Object.entries(ZONES)) {
    const made = await desk.call(admin, addZone, { body: { ...zone, weekdays: [...weekdays] } });
    zoneIds.set(key, made.id);
  }
  for (const customer of CUSTOMERS) {
    for (const site of customer.sites) {
      await desk.call(admin, setSiteZone, {
        params: { customerId: customers.get(customer.key) ?? '', siteId: sites.get(site.key) ?? '' },
        body: { zoneId: zoneIds.get(site.zone) ?? '' },
        ifMatch: 0,
      });
    }
  }
}
