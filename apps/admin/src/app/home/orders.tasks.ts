import type { OrderListItem } from '@seamwright/ordering/contracts';
import { paymentWords } from '@seamwright/ordering/ui';
import type { PackingOrderWire } from '@seamwright/plant/contracts';
import { currencyCode, formatMoney, minorUnits, unwrap } from '@seamwright/shared/util';
import { inWords } from './plant-day';
import type { Task } from './task';

/** Orders that are placed but not confirmed, the soonest delivery first. */
export const waitingOrderTasks = (orders: readonly OrderListItem[], locale: string): Task[] =>
  [...orders]
    .sort((a, b) => a.deliveryDay.localeCompare(b.deliveryDay) || a.number - b.number)
    .map(({ customer, currency, deliveryDay, id, number, payment, totals }) => {
      const code = unwrap(currencyCode(currency));
      const { tone, word } = paymentWords(payment, code, locale);
      const most = formatMoney(minorUnits(totals.max.totalMinor), code, locale);
      return {
        id,
        figure: String(number),
        text: customer.name,
        note: $localize`:@@admin.home.waiting:for ${inWords(deliveryDay, locale)}:day: · at most ${most}:amount:`,
        link: ['/orders', id],
        mark: { tone, word },
      };
    });

/** Orders on the floor that are not finished, by number; the pieces are those still to be weighed. */
export const packingTasks = (orders: readonly PackingOrderWire[]): Task[] =>
  orders
    .filter(({ packedAt }) => packedAt === null)
    .sort((a, b) => a.number - b.number)
    .map(({ customer, deliveryDay, id, lines, number, siteName }) => {
      const open = lines.reduce(
        (sum, line) => sum + Math.max(0, line.pieces - line.packedPieces - line.shortPieces),
        0,
      );
      return {
        id,
        figure: String(open),
        unit: open === 1 ? $localize`:@@admin.home.piece:piece` : $localize`:@@admin.home.pieces:pieces`,
        text: customer.name,
        note: $localize`:@@admin.home.packing:Order ${number}:number: · ${siteName}:site:`,
        link: ['/scale', deliveryDay, id],
        mark:
          open === 0
            ? { tone: 'ok', word: $localize`:@@admin.home.packingReady:Ready to finish` }
            : { tone: 'info', word: $localize`:@@admin.home.packingOpen:To pack` },
      };
    });
