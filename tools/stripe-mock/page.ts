import { Router, type Response } from 'express';
import { balanceOf } from './balance';
import type { Charge } from './charges';
import { bankStatement } from './bank-statement';
import { SECONDS_PER_DAY } from './clock';
import { ApiError } from './errors';
import { minorUnits } from './minor-units';
import type { PaymentIntent } from './payment-intents';
import { arrive, fail, findPayout, type Payout } from './payouts';
import { html, type Markup } from '../stand-in/html';
import { loopbackOnly } from '../stand-in/loopback';
import { sendPage, table } from '../stand-in/page-shell';
import type { StripeMock } from './stripe-mock';
import type { Delivery } from './webhooks';

const SHOWN = 50;
const newest = <Item>(items: Map<string, Item>): Item[] => [...items.values()].slice(-SHOWN).reverse();

/** What the page says after a button was pressed. */
const notes: Record<string, string> = {
  'paid-out': 'Paid out. The new payout is at the top of the payouts.',
  'nothing-to-pay-out': 'Nothing was paid out: the balance has no money in it.',
  arrived: 'The payout has reached the bank.',
  failed: 'The bank sent the payout back; the money is in the balance again.',
  repeated: 'The webhook will be sent once more.',
  advanced: 'The clock was moved on by a day.',
  late: 'That was already done.',
};

function when(seconds: number): Markup {
  const iso = new Date(seconds * 1000).toISOString();
  return html`<time datetime="${iso}">${iso.slice(0, 16).replace('T', ' ')}</time>`;
}

function button(action: string, label: string, about: string, kind = ''): Markup {
  return html`<form method="post" action="${action}">
    <button class="${kind}" aria-label="${label}: ${about}">${label}</button>
  </form>`;
}

const statusWords: Partial<Record<string, string>> = {
  requires_capture: 'held',
  requires_action: 'waits for the bank',
  requires_payment_method: 'needs a card',
  requires_confirmation: 'to be confirmed',
  in_transit: 'on its way',
  given_up: 'given up',
};
const words = (status: string) => statusWords[status] ?? status;

function intentsTable(intents: PaymentIntent[]): Markup {
  return table(
    'Payment intents, newest first',
    [
      { head: 'Made (UTC)', cell: ({ created }) => when(created) },
      { head: 'Intent', cell: ({ id }) => html`<code>${id}</code>` },
      { head: 'What for', cell: ({ description }) => description ?? '–' },
      { head: 'State', cell: ({ status }) => words(status) },
      { head: 'Amount', cell: ({ amount, currency }) => minorUnits(amount, currency), number: true },
      { head: 'Held', cell: (intent) => minorUnits(intent.amount_capturable, intent.currency), number: true },
      { head: 'Taken', cell: (intent) => minorUnits(intent.amount_received, intent.currency), number: true },
    ],
    intents,
    'No payment intents yet. They appear when an order is placed by card.',
  );
}

function chargeState(charge: Charge, intents: Map<string, PaymentIntent>): string {
  if (charge.status === 'failed') return `refused: ${charge.outcome.reason ?? charge.failure_code ?? ''}`;
  if (charge.refunded) return 'refunded';
  if (charge.captured) return 'captured';
  return intents.get(charge.payment_intent)?.status === 'requires_capture' ? 'held' : 'let go';
}

function chargesTable(mock: StripeMock): Markup {
  const { balanceTransactions, paymentIntents } = mock.state;
  const fee = (charge: Charge) => balanceTransactions.get(charge.balance_transaction ?? '')?.fee ?? 0;
  return table(
    'Charges, newest first',
    [
      { head: 'Made (UTC)', cell: ({ created }) => when(created) },
      { head: 'Charge', cell: ({ id }) => html`<code>${id}</code>` },
      {
        head: 'Card',
        cell: ({ payment_method_details: { card } }) => `${card.brand} ending ${card.last4}`,
      },
      { head: 'State', cell: (charge) => chargeState(charge, paymentIntents) },
      { head: 'Captured', cell: (charge) => minorUnits(charge.amount_captured, charge.currency), number: true },
      { head: 'Refunded', cell: (charge) => minorUnits(charge.amount_refunded, charge.currency), number: true },
      { head: 'Fee', cell: (charge) => minorUnits(fee(charge), charge.currency), number: true },
    ],
    newest(mock.state.charges),
    'No charges yet.',
  );
}

function payoutsTable(payouts: Payout[]): Markup {
  const acts = ({ id, status }: Payout) =>
    status === 'paid' || status === 'failed'
      ? '–'
      : html`${button(`/payouts/${id}/arrive`, 'Arrive', `payout ${id} reaches the bank`)}
        ${button(`/payouts/${id}/fail`, 'Fail', `payout ${id} comes back`, 'plain')}`;
  return table(
    'Payouts, newest first',
    [
      { head: 'Made (UTC)', cell: ({ created }) => when(created) },
      { head: 'Payout', cell: ({ id }) => html`<code>${id}</code>` },
      { head: 'State', cell: ({ status }) => words(status) },
      { head: 'At the bank (UTC)', cell: (payout) => when(payout.arrival_date) },
      { head: 'Amount', cell: ({ amount, currency }) => minorUnits(amount, currency), number: true },
      { head: 'Next', cell: acts },
    ],
    payouts,
    'No payouts yet.',
  );
}

function lastAnswer({ attempts }: Delivery): string {
  const last = attempts.at(-1);
  return last ? String(last.status ?? last.error) : '–';
}

function deliveriesTable(deliveries: Delivery[]): Markup {
  return table(
    'Webhook deliveries, newest first',
    [
      { head: 'Queued (UTC)', cell: ({ created }) => when(created) },
      { head: 'Event', cell: ({ type, event }) => html`${type}<br /><code>${event}</code>` },
      { head: 'To', cell: ({ url }) => html`<code>${url}</code>` },
      { head: 'State', cell: ({ status }) => words(status) },
      { head: 'Attempts', cell: ({ attempts }) => attempts.length, number: true },
      { head: 'Last answer', cell: lastAnswer },
      {
        head: 'Next',
        cell: ({ id, type }) => button(`/deliveries/${id}/repeat`, 'Repeat', `webhook ${type}`, 'plain'),
      },
    ],
    deliveries,
    'No webhooks yet.',
  );
}

function sendState(mock: StripeMock, response: Response, note: string | undefined): void {
  const { state } = mock;
  const balance = balanceOf(state);
  const content = html`<header>
      <h1>Card processor, stand-in</h1>
      <p class="quiet">No real money moves here. Its clock says ${when(mock.processor.clock.seconds())} UTC.</p>
    </header>
    <main id="content">
      ${note && html`<p class="note" role="status">${note}</p>`}
      <h2>Balance</h2>
      <dl class="figures">
        ${balance.available.map(
          ({ amount, currency }) =>
            html`<div>
              <dt>Available</dt>
              <dd>${minorUnits(amount, currency)}</dd>
            </div>`,
        )}
        ${balance.pending.map(
          ({ amount, currency }) =>
            html`<div>
              <dt>On its way in</dt>
              <dd>${minorUnits(amount, currency)}</dd>
            </div>`,
        )}
      </dl>
      <p class="quiet">"Pay out now" pays out both: it makes what is on its way in available first.</p>
      <div class="acts">
        ${button('/pay-out', 'Pay out now', 'all of the balance')}
        ${button('/advance-day', 'Next day', 'move the clock on by 24 hours', 'plain')}
        <a href="/">Refresh</a>
      </div>
      <h2>Payment intents</h2>
      ${intentsTable(newest(state.paymentIntents))}
      <h2>Charges</h2>
      ${chargesTable(mock)}
      <h2>Payouts</h2>
      ${payoutsTable(newest(state.payouts))}
      <p class="quiet">
        What the demo's bank would show, for the import of a bank statement:
        <a href="/bank-statement.csv">as it should be</a>,
        <a href="/bank-statement.csv?short=4200">42.00 short on its newest line</a>.
      </p>
      <h2>Webhooks</h2>
      ${deliveriesTable(newest(state.deliveries))}
    </main>`;
  sendPage(response, 'Card processor, stand-in', content);
}

/** The page that shows what the stand-in holds, and its buttons; each answers with the page again. */
export function pageRouter(mock: StripeMock): Router {
  const router = Router();
  router.use(loopbackOnly());
  const press = (path: string, note: string, act: (id: string) => unknown) =>
    router.post(path, (request, response) => {
      let said = note;
      try {
        const { id } = request.params;
        const outcome = act(typeof id === 'string' ? id : '');
        if (typeof outcome === 'string') said = outcome;
      } catch (error) {
        if (!(error instanceof ApiError)) throw error;
        said = 'late';
      }
      mock.changed();
      response.redirect(303, `/?note=${said}`);
    });

  router.get('/', (request, response) => {
    mock.settle();
    const { note } = request.query;
    sendState(mock, response, typeof note === 'string' && Object.hasOwn(notes, note) ? notes[note] : undefined);
  });
  router.get('/bank-statement.csv', (request, response) => {
    mock.settle();
    const { short, since } = request.query;
    const number = (value: unknown) => (typeof value === 'string' && /^\d{1,12}$/.test(value) ? Number(value) : 0);
    response.attachment('bank-statement.csv').type('csv');
    response.send(bankStatement(mock.state.payouts.values(), { since: number(since), shortBy: number(short) }));
  });
  press('/pay-out', 'paid-out', () => {
    const made = mock.payOut({ includePending: true });
    return made.length === 0 ? 'nothing-to-pay-out' : 'paid-out';
  });
  press('/advance-day', 'advanced', () => mock.advanceClock(SECONDS_PER_DAY));
  press('/payouts/:id/arrive', 'arrived', (id) => arrive(mock.processor, findPayout(mock.state, id)));
  press('/payouts/:id/fail', 'failed', (id) => fail(mock.processor, findPayout(mock.state, id)));
  press('/deliveries/:id/repeat', 'repeated', (id) => mock.webhooks.repeat(id));
  return router;
}
