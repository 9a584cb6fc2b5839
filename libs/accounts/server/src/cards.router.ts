import { addCard, cardSettings, listCards, removeCard, type CardWire } from '@seamwright/accounts/contracts';
import {
  conflict,
  implement,
  implementOnce,
  inTransaction,
  notFound,
  ProblemError,
  type Caller,
  type Implementation,
  type JobContext,
} from '@seamwright/shared/server';
import { newId, RefusalError } from '@seamwright/shared/util';
import { cardById, insertCard, keptCards, moveCard, type CardRecord } from './cards.repository';
import { settleCard } from './keep-card';
import type { AccountsParts } from './parts';

/** A buyer speaks for her own customer; staff say for whom. */
function customerSpokenFor(caller: Caller, named: string | undefined): string {
  if (caller.kind === 'user') {
    if (named !== undefined && named !== caller.customerId) throw notFound();
    return caller.customerId;
  }
  if (named === undefined) throw new RefusalError({ code: 'customer-missing', params: {}, pointer: '/customerId' });
  return named;
}

export function cardImplementations(parts: AccountsParts): Implementation[] {
  const { clock, publishableKey } = parts;
  /** What was committed stands: without an answer it is asked for again later. */
  const settle = (context: Pick<JobContext, 'database' | 'log'>, id: string): Promise<void> =>
    settleCard({ database: context.database, log: context.log, clock }, parts, id).catch((error: unknown) =>
      context.log.error({ err: error, card: id }, 'a card was not settled'),
    );
  return [
    implement(cardSettings, async () => ({
      mode: publishableKey ? ('live' as const) : ('demo' as const),
      publishableKey,
    })),
    implement(listCards, ({ database, caller }, { query }) =>
      inTransaction(database, caller, async (tx) => {
        const cards = await keptCards(tx, customerSpokenFor(caller, query.customerId));
        return { items: cards.map(present) };
      }),
    ),
    implementOnce(addCard, {
      async make(tx, { now, caller }, { body }) {
        const id = newId<'Card'>();
        await insertCard(tx, now, { id, customerId: customerSpokenFor(caller, undefined), methodId: body.methodId });
        return id;
      },
      afterCommit: settle,
      async present(tx, _context, id) {
        const card = await cardById(tx, id);
        if (card.state === 'adding') throw conflict('card-not-added-yet');
        if (card.state === 'refused') throw refused(card);
        return present(card);
      },
    }),
    implement(removeCard, async (context, { params: { cardId } }) => {
      const { database, caller, now } = context;
      await inTransaction(database, caller, async (tx) => {
        const card = await cardById(tx, cardId);
        if (card.state === 'removing' || card.state === 'removed') return;
        if (!(await moveCard(tx, now, cardId, 'kept', { state: 'removing' }))) throw notFound();
      });
      await settle(context, cardId);
      return undefined;
    }),
  ];
}

const present = ({ id, brand, last4, expires }: CardRecord): CardWire => ({
  id,
  brand: brand ?? '',
  last4: last4 ?? '',
  expires: expires ?? '',
});

function refused({ declineCode }: CardRecord): ProblemError {
  if (declineCode === 'method-unknown') return new ProblemError(422, { code: 'method-unknown', params: {} });
  return new ProblemError(422, { code: 'card-refused', params: { reason: declineCode ?? '' } });
}
