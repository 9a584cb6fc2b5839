import type { InvoiceListItem } from '@seamwright/accounts/contracts';
import type { AccountsWork, CountedSoFar } from '@seamwright/accounts/data-access';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { formatMoney, minorUnits, type PlantDate } from '@seamwright/shared/util';
import { daysAhead, inWords } from './plant-day';
import type { Task } from './task';

const figureOf = ({ count, more }: CountedSoFar): string => (more ? `${count}+` : String(count));

/** The day's three counts of money, each with where it is looked into. */
export function accountsTasks({ openExceptions, overdueInvoices, holdsEndingSoon }: AccountsWork): Task[] {
  return [
    {
      id: 'exceptions',
      figure: String(openExceptions),
      text: $localize`:@@admin.home.exceptions:Not explained in this week’s card money`,
      note: $localize`:@@admin.home.exceptions.note:Cards, fees, payouts and the bank`,
      link: ['/reconciliation'],
      mark:
        openExceptions === 0
          ? { tone: 'ok', word: $localize`:@@admin.home.exceptions.none:Every penny is explained` }
          : { tone: 'bad', word: $localize`:@@admin.home.exceptions.some:Look into it` },
    },
    {
      id: 'overdue',
      figure: figureOf(overdueInvoices),
      text: $localize`:@@admin.home.overdueCount:Invoices overdue`,
      note: $localize`:@@admin.home.overdueCount.note:The day of payment has passed`,
      link: ['/invoices'],
      query: { standing: 'overdue' },
      mark:
        overdueInvoices.count === 0
          ? { tone: 'ok', word: $localize`:@@admin.home.overdueCount.zero:None` }
          : { tone: 'eye', word: $localize`:@@admin.home.overdueCount.some:Remind` },
    },
    {
      id: 'holds',
      figure: figureOf(holdsEndingSoon),
      text: $localize`:@@admin.home.holds:Card holds that end within two days`,
      note: $localize`:@@admin.home.holds.note:To be packed and taken before`,
      link: ['/payments'],
      query: { state: 'pre-authorised' },
      mark:
        holdsEndingSoon.count === 0
          ? { tone: 'ok', word: $localize`:@@admin.home.holds.zero:None` }
          : { tone: 'eye', word: $localize`:@@admin.home.holds.some:Ask the planner` },
    },
  ];
}

/** Overdue invoices with what is left to pay, the longest overdue first. */
export const overdueTasks = (invoices: readonly InvoiceListItem[], today: PlantDate, locale: string): Task[] =>
  [...invoices]
    .sort((a, b) => a.dueOn.localeCompare(b.dueOn) || a.number - b.number)
    .map(({ id, number, customer, dueOn, totalMinor, paidMinor }) => {
      const over = -daysAhead(dueOn, today);
      return {
        id,
        figure: formatMoney(minorUnits(totalMinor - paidMinor), HOUSE_CURRENCY, locale),
        text: customer.name,
        note: $localize`:@@admin.home.overdueInvoice:Invoice ${String(number)}:number: · due ${inWords(dueOn, locale)}:day:`,
        link: ['/invoices', id],
        mark: {
          tone: 'bad',
          word:
            over === 1
              ? $localize`:@@admin.home.overdueOne:1 day over`
              : $localize`:@@admin.home.overdueDays:${over}:days: days over`,
        },
      };
    });
