import type { PersonView } from '@seamwright/identity/contracts';
import { roleName } from '@seamwright/identity/ui';
import type { ClosureWire } from '@seamwright/ordering/contracts';
import type { PlantDate } from '@seamwright/shared/util';
import { daysAhead, inWords } from './plant-day';
import type { Task } from './task';

/** Whoever was invited and has not joined: staff lead to the people, buyers to their customer. */
export const invitedTasks = (people: readonly PersonView[]): Task[] =>
  people
    .filter(({ state }) => state === 'invited')
    .map(({ customerId, customerName, email, id, name, roles }) => ({
      id,
      figure: '',
      text: name,
      note: [customerName ?? roles.map(roleName).join(', '), email].join(' · '),
      link: customerId === null ? ['/people'] : ['/customers', customerId],
      mark: { tone: 'info', word: $localize`:@@admin.home.invited:Invited` },
    }));

/** Days ahead on which the plant is closed, the next one first. */
export const closureTasks = (closures: readonly ClosureWire[], today: PlantDate, locale: string): Task[] =>
  closures
    .filter(({ day }) => daysAhead(day, today) >= 0)
    .sort((a, b) => a.day.localeCompare(b.day))
    .map(({ day, reason }) => ({
      id: day,
      figure: inWords(day, locale),
      text: reason,
      link: ['/calendar'],
    }));
