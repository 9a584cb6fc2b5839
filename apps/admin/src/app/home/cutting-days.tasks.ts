import { cutOffOf, isDeliveryDay, type DeliveryZone } from '@seamwright/ordering/domain';
import type { CuttingDayWire } from '@seamwright/plant/contracts';
import { timeLeft } from '@seamwright/shared/ui';
import { isPlantDate, type PlantDate } from '@seamwright/shared/util';
import { inWords } from './plant-day';
import type { Task } from './task';

/** When the vans go, and where to. */
export interface Vans {
  readonly zones: readonly DeliveryZone[];
  readonly closures: ReadonlySet<PlantDate>;
  readonly timeZone: string;
}

/** The instant after which no zone takes orders for the day any more; null when no van goes. */
export function lastCutOff(day: string, { zones, closures, timeZone }: Vans): Date | null {
  if (!isPlantDate(day)) return null;
  const cutOffs = zones
    .filter((zone) => isDeliveryDay(zone, day, closures))
    .map((zone) => cutOffOf(zone, day, closures, timeZone).getTime());
  return cutOffs.length === 0 ? null : new Date(Math.max(...cutOffs));
}

/** The cutting days that are not finished, the next one first, each with what it waits for. */
export function cuttingDayTasks(days: readonly CuttingDayWire[], vans: Vans, now: Date, locale: string): Task[] {
  return days
    .filter(({ state }) => state !== 'finished' && state !== 'locked')
    .sort((a, b) => a.deliveryDay.localeCompare(b.deliveryDay))
    .map((day) => ({
      id: day.id,
      figure: String(day.orders),
      unit: day.orders === 1 ? $localize`:@@admin.home.order:order` : $localize`:@@admin.home.orders:orders`,
      text: $localize`:@@admin.home.day:Cut ${inWords(day.cuttingDay, locale)}:cutting:, deliver ${inWords(day.deliveryDay, locale)}:delivery:`,
      note:
        day.waitingOrders > 0
          ? $localize`:@@admin.home.dayWaiting:${day.lines}:lines: lines · orders that still wait: ${day.waitingOrders}:waiting:`
          : $localize`:@@admin.home.dayLines:${day.lines}:lines: lines`,
      link: ['/cutting-days', day.deliveryDay],
      mark: markOf(day, lastCutOff(day.deliveryDay, vans), now),
    }));
}

function markOf(day: CuttingDayWire, cutOff: Date | null, now: Date): NonNullable<Task['mark']> {
  if (day.state === 'released') {
    return day.packedOrders === day.orders
      ? { tone: 'eye', word: $localize`:@@admin.home.dayPacked:All packed: finish it` }
      : {
          tone: 'info',
          word: $localize`:@@admin.home.dayPacking:${day.packedOrders}:packed: of ${day.orders}:orders: packed`,
        };
  }
  if (day.state !== 'open') return { tone: 'eye', word: $localize`:@@admin.home.dayClosed:Not yet on the floor` };
  if (cutOff === null || now >= cutOff)
    return { tone: 'eye', word: $localize`:@@admin.home.dayOver:Cut-off passed: close it` };
  const left = timeLeft(Math.floor((cutOff.getTime() - now.getTime()) / 60_000));
  return { tone: 'plain', word: $localize`:@@admin.home.dayOpen:${left}:time: to cut-off` };
}
