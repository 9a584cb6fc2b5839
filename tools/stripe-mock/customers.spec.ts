import type Stripe from 'stripe';
import { errorOf, startMock, type RunningMock } from './testing/running-mock';

let running: RunningMock;
let stripe: Stripe;

beforeEach(async () => {
  running = await startMock();
  stripe = running.stripe;
});
afterEach(async () => {
  await running.close();
  expect(running.violations).toEqual([]);
});

describe('customers', () => {
  it('are made, changed, found by mail address and deleted', async () => {
    const made = await stripe.customers.create({ name: 'The Fold Inn', email: 'kitchen@fold.example' });
    await stripe.customers.create({ name: 'Another' });
    await stripe.customers.update(made.id, { phone: '01632 960001', metadata: { site: '3' } });
    const found = await stripe.customers.list({ email: 'kitchen@fold.example' });
    expect(found.data).toMatchObject([{ id: made.id, phone: '01632 960001', metadata: { site: '3' } }]);
    await stripe.customers.del(made.id);
    expect(await stripe.customers.retrieve(made.id)).toMatchObject({ id: made.id, deleted: true });
    expect((await errorOf(stripe.customers.update(made.id, { name: 'Again' }))).code).toBe('resource_missing');
    expect((await stripe.customers.list()).data).toHaveLength(1);
  });

  it('keep the address in all its parts', async () => {
    const made = await stripe.customers.create({ address: { line1: '4 Drove Lane', country: 'GB' } });
    expect(made.address).toMatchObject({ line1: '4 Drove Lane', line2: null, country: 'GB' });
  });
});

describe('saved cards', () => {
  it('are attached, listed, chosen as default and detached', async () => {
    const { id: customer } = await stripe.customers.create({});
    const visa = await stripe.paymentMethods.attach('pm_card_visa', { customer });
    const mastercard = await stripe.paymentMethods.attach('pm_card_mastercard', { customer });
    expect(visa).toMatchObject({ customer, card: { brand: 'visa', last4: '4242' } });
    const listed = await stripe.customers.listPaymentMethods(customer);
    expect(listed.data.map(({ id }) => id)).toEqual([mastercard.id, visa.id]);
    await stripe.customers.update(customer, { invoice_settings: { default_payment_method: visa.id } });
    const expanded = await stripe.customers.retrieve(customer, { expand: ['invoice_settings.default_payment_method'] });
    expect(expanded).toMatchObject({ invoice_settings: { default_payment_method: { id: visa.id } } });
    expect((await stripe.paymentMethods.detach(visa.id)).customer).toBeNull();
    expect(await stripe.customers.retrieve(customer)).toMatchObject({
      invoice_settings: { default_payment_method: null },
    });
    expect((await stripe.paymentMethods.list({ customer, type: 'card' })).data).toHaveLength(1);
    expect((await errorOf(stripe.paymentMethods.detach(visa.id))).statusCode).toBe(400);
  });

  it('belong to one customer', async () => {
    const first = await stripe.customers.create({});
    const second = await stripe.customers.create({});
    const card = await stripe.paymentMethods.attach('pm_card_visa', { customer: first.id });
    expect((await errorOf(stripe.paymentMethods.attach(card.id, { customer: second.id }))).statusCode).toBe(400);
    const intent = stripe.paymentIntents.create({
      amount: 500,
      currency: 'gbp',
      customer: second.id,
      payment_method: card.id,
    });
    expect((await errorOf(intent)).param).toBe('payment_method');
  });

  it('are refused when the bank refuses them, all but the one that fails only when charged', async () => {
    const { id: customer } = await stripe.customers.create({});
    const declined = await errorOf(stripe.paymentMethods.attach('pm_card_visa_chargeDeclined', { customer }));
    expect(declined).toMatchObject({ statusCode: 402, code: 'card_declined' });
    const saved = await stripe.paymentMethods.attach('pm_card_chargeCustomerFail', { customer });
    const charged = stripe.paymentIntents.create({
      amount: 500,
      currency: 'gbp',
      customer,
      payment_method: saved.id,
      confirm: true,
      off_session: true,
    });
    expect(await errorOf(charged)).toMatchObject({ code: 'card_declined', decline_code: 'generic_decline' });
  });

  it('never come as numbers', async () => {
    const create = stripe.paymentMethods.create({
      type: 'card',
      card: { number: '4242424242424242', exp_month: 1, exp_year: 2030 },
    });
    expect((await errorOf(create)).message).toContain('never pass this server');
  });

  it('are kept by a payment that says so', async () => {
    const { id: customer } = await stripe.customers.create({});
    await stripe.paymentIntents.create({
      amount: 500,
      currency: 'gbp',
      customer,
      payment_method: 'pm_card_visa',
      confirm: true,
      setup_future_usage: 'off_session',
    });
    expect((await stripe.customers.listPaymentMethods(customer)).data).toHaveLength(1);
    expect((await stripe.events.list({ type: 'payment_method.attached' })).data).toHaveLength(1);
  });
});

describe('setup intents', () => {
  it('keep a card for later', async () => {
    const { id: customer } = await stripe.customers.create({});
    const setup = await stripe.setupIntents.create({ customer, payment_method: 'pm_card_visa', confirm: true });
    expect(setup).toMatchObject({ status: 'succeeded', customer, usage: 'off_session' });
    expect((await stripe.customers.listPaymentMethods(customer)).data[0]?.id).toBe(setup.payment_method);
    expect((await stripe.events.list({ type: 'setup_intent.succeeded' })).data).toHaveLength(1);
    expect((await errorOf(stripe.setupIntents.cancel(setup.id))).code).toBe('setup_intent_unexpected_state');
  });

  it('tell why a card was refused and take another', async () => {
    const { id: customer } = await stripe.customers.create({});
    const setup = await stripe.setupIntents.create({ customer });
    const error = await errorOf(
      stripe.setupIntents.confirm(setup.id, { payment_method: 'pm_card_chargeDeclinedExpiredCard' }),
    );
    expect(error).toMatchObject({ statusCode: 402, code: 'expired_card', setup_intent: { id: setup.id } });
    expect(await stripe.setupIntents.retrieve(setup.id)).toMatchObject({
      status: 'requires_payment_method',
      last_setup_error: { code: 'expired_card' },
    });
    const done = await stripe.setupIntents.confirm(setup.id, { payment_method: 'pm_card_mastercard' });
    expect(done).toMatchObject({ status: 'succeeded', last_setup_error: null });
  });

  it('wait for the bank and can be canceled meanwhile', async () => {
    const ask = () => stripe.setupIntents.create({ payment_method: 'pm_card_authenticationRequired', confirm: true });
    const first = await ask();
    expect(first).toMatchObject({ status: 'requires_action', next_action: { type: 'redirect_to_url' } });
    await running.control(`/intents/${first.id}/authenticate`, { outcome: 'confirmed' });
    expect((await stripe.setupIntents.retrieve(first.id)).status).toBe('succeeded');
    const second = await ask();
    expect((await stripe.setupIntents.cancel(second.id)).status).toBe('canceled');
    expect((await stripe.setupIntents.list()).data.map(({ id }) => id)).toEqual([second.id, first.id]);
  });
});
