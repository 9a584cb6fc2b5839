import { addCard, importBankStatement } from '@seamwright/accounts/contracts';
import { anonymous as nobody, type Caller } from '@seamwright/shared/server';
import { addDays, weekdayOf, type PlantDate } from '@seamwright/shared/util';
import type { Desk } from '../desk';
import { at } from '../history/history-days';
import { CUSTOMERS } from '../scenario/customers';
import type { Till } from './till';

/** Documented test methods that are accepted. */
const ACCEPTED = 'pm_card_visa';
const MONDAY = 1;
const FRIDAY = 5;

interface Processor {
  /** Where the stand-in is reached. */
  readonly origin: string;
  readonly desk: Desk;
  readonly callers: ReadonlyMap<string, Caller>;
}

/** Cards at the processor's stand-in, whose clock goes along with the desk's: starts with a clean stand-in at `start`. */
export async function openCardTill({ origin, desk, callers }: Processor, start: Date): Promise<Till> {
  const lever = async (name: string, body: object): Promise<void> => {
    const answer = await fetch(`${origin}/control/${name}`, {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify(body),
    });
    if (!answer.ok) throw new Error(`The card stand-in refused ${name}: ${await answer.text()}`);
  };
  await lever('reset', { at: start.toISOString() });
  const cards = new Map<string, string>();

  return {
    moveTo: (instant) => lever('advance-clock', { to: instant.toISOString() }),
    async cardOf(customerKey) {
      const kept = cards.get(customerKey);
      if (kept) return kept;
      const buyer = CUSTOMERS.find(({ key }) => key === customerKey)?.buyers[0];
      const caller = callers.get(buyer?.key ?? '');
      if (!caller) throw new Error(`Nobody buys for "${customerKey}"`);
      const card = await desk.call(caller, addCard, { body: { methodId: ACCEPTED } });
      cards.set(customerKey, card.id);
      return card.id;
    },
    // The processor pays out every Friday what has become available, our books follow by the periodic jobs, and on
    // Monday accounts takes the bank's statement. The newest one is left for whoever plays the demo.
    async endOfDay(day: PlantDate, newest: boolean) {
      if (weekdayOf(day) === FRIDAY) await lever('pay-out', {});
      await desk.comeRound();
      if (weekdayOf(day) !== MONDAY || newest) return;
      const since = at(addDays(day, -6), '00:00').getTime() / 1000;
      const statement = await fetch(`${origin}/bank-statement.csv?since=${since}`);
      const bytes = Buffer.from(await statement.arrayBuffer());
      if (!bytes.includes('po_')) return;
      const file = { fileName: `statement-${day}.csv`, bytes };
      await desk.call(callers.get('anneke') ?? nobody, importBankStatement, { file });
    },
  };
}
