import express, { Router, type Response } from 'express';
import * as z from 'zod';
import { authenticate } from './control';
import { minorUnits } from './minor-units';
import type { PaymentIntent } from './payment-intents';
import type { SetupIntent } from './setup-intents';
import { html } from '../stand-in/html';
import { loopbackOnly } from '../stand-in/loopback';
import { sendPage } from '../stand-in/page-shell';
import type { StripeMock } from './stripe-mock';

const answerForm = z.object({ client_secret: z.string(), outcome: z.enum(['confirmed', 'refused']) });

function findWaiting(mock: StripeMock, id: string, secret: unknown): PaymentIntent | SetupIntent | undefined {
  const intent = mock.state.paymentIntents.get(id) ?? mock.state.setupIntents.get(id);
  if (!intent || intent.client_secret !== secret || intent.status !== 'requires_action') return undefined;
  return intent;
}

function sendNothingToConfirm(response: Response): void {
  const content = html`<main id="content">
    <h1>Nothing to confirm</h1>
    <p>This payment is not waiting for the bank. It may have been confirmed already. Go back to the shop.</p>
  </main>`;
  sendPage(response, 'Nothing to confirm', content, 404);
}

function backTo(returnUrl: string, intent: PaymentIntent | SetupIntent, confirmed: boolean): string {
  const url = new URL(returnUrl);
  url.searchParams.set(intent.object, intent.id);
  url.searchParams.set(`${intent.object}_client_secret`, intent.client_secret);
  url.searchParams.set('redirect_status', confirmed ? 'succeeded' : 'failed');
  return url.href;
}

/** The page of the "bank", where the holder of a card confirms or refuses, and is sent back to the shop. */
export function authenticationRouter(mock: StripeMock): Router {
  const router = Router();
  router.use('/authenticate', loopbackOnly(), express.urlencoded({ extended: false, limit: '10kb' }));
  router.get('/authenticate/:id', (request, response) => {
    const intent = findWaiting(mock, request.params.id, request.query['client_secret']);
    if (!intent) return sendNothingToConfirm(response);
    const what =
      intent.object === 'payment_intent'
        ? html`Do you want to pay <strong>${minorUnits(intent.amount, intent.currency)}</strong>?`
        : 'Do you want this card to be kept for later payments?';
    const content = html`<header><h1>Your bank asks: is this you?</h1></header>
      <main id="content">
        <p>${what}</p>
        <p class="quiet">Stand-in for the bank's own page. No real money moves.</p>
        <form method="post" class="acts">
          <input type="hidden" name="client_secret" value="${intent.client_secret}" />
          <button name="outcome" value="confirmed">Confirm</button>
          <button name="outcome" value="refused" class="plain">Refuse</button>
        </form>
      </main>`;
    sendPage(response, 'Confirm with your bank', content);
  });
  router.post('/authenticate/:id', (request, response) => {
    const form = answerForm.safeParse(request.body);
    const intent = form.success ? findWaiting(mock, request.params.id, form.data.client_secret) : undefined;
    if (!form.success || !intent) return sendNothingToConfirm(response);
    const returnUrl = intent.next_action?.redirect_to_url.return_url ?? null;
    authenticate(mock, intent.id, form.data.outcome === 'confirmed');
    const confirmed = intent.status !== 'requires_payment_method';
    if (returnUrl !== null) return response.redirect(303, backTo(returnUrl, intent, confirmed));
    const content = html`<main id="content">
      <h1>${confirmed ? 'Confirmed' : 'Refused'}</h1>
      <p>You can close this page and go back to the shop.</p>
    </main>`;
    sendPage(response, confirmed ? 'Confirmed' : 'Refused', content);
  });
  return router;
}
