import * as z from 'zod';
import type { ApiRoute } from './api-route';
import { noSuch } from './errors';
import { newId } from './identifiers';
import { listPage, listParameters } from './lists';
import { address, clearableText, mergeMetadata, metadata, readParameters, shipping, text } from './parameters';
import type { Metadata } from './parameters';
import { attachMethod, findPaymentMethod, methodsOfCustomer, usePaymentMethod } from './payment-methods';
import type { Processor } from './processor';
import { keep, type State } from './state';

/** Someone whose cards are kept. */
export interface Customer {
  id: string;
  object: 'customer';
  address: object | null;
  balance: 0;
  created: number;
  currency: null;
  default_source: null;
  delinquent: false;
  description: string | null;
  discount: null;
  email: string | null;
  invoice_settings: {
    custom_fields: null;
    default_payment_method: string | null;
    footer: null;
    rendering_options: null;
  };
  livemode: false;
  metadata: Metadata;
  name: string | null;
  phone: string | null;
  preferred_locales: string[];
  shipping: object | null;
  tax_exempt: 'none';
  test_clock: null;
}

/** What is left of a customer after deletion. */
export interface DeletedCustomer {
  id: string;
  object: 'customer';
  deleted: true;
}

const editable = {
  address: address.optional(),
  description: clearableText.optional(),
  email: clearableText.optional(),
  invoice_settings: z.strictObject({ default_payment_method: clearableText.optional() }).optional(),
  metadata: metadata.optional(),
  name: clearableText.optional(),
  phone: clearableText.optional(),
  shipping: shipping.optional(),
};
const createParameters = z.strictObject({ ...editable, payment_method: text.optional() });
const updateParameters = z.strictObject(editable);
const listCustomers = z.strictObject({ ...listParameters, email: text.optional() });

/** The customer an object refers to by parameter. @throws ApiError when there is none or it was deleted */
export function findCustomer(state: State, id: string, param: string, inPath = false): Customer {
  const customer = state.customers.get(id);
  if (!customer || 'deleted' in customer) throw noSuch('customer', id, param, inPath);
  return customer;
}

function newCustomer(created: number): Customer {
  return {
    id: newId('cus'),
    object: 'customer',
    address: null,
    balance: 0,
    created,
    currency: null,
    default_source: null,
    delinquent: false,
    description: null,
    discount: null,
    email: null,
    invoice_settings: { custom_fields: null, default_payment_method: null, footer: null, rendering_options: null },
    livemode: false,
    metadata: {},
    name: null,
    phone: null,
    preferred_locales: [],
    shipping: null,
    tax_exempt: 'none',
    test_clock: null,
  };
}

function edit(state: State, customer: Customer, given: z.output<typeof updateParameters>): Customer {
  const { invoice_settings: settings, metadata: givenMetadata, ...plain } = given;
  const method = settings?.default_payment_method;
  if (method) {
    const owner = findPaymentMethod(state, method, 'invoice_settings[default_payment_method]').customer;
    if (owner !== customer.id) {
      throw noSuch('payment_method', method, 'invoice_settings[default_payment_method]');
    }
  }
  Object.assign(customer, plain);
  if (method !== undefined) customer.invoice_settings.default_payment_method = method;
  customer.metadata = mergeMetadata(customer.metadata, givenMetadata);
  return customer;
}

export function customerRoutes(processor: Processor): ApiRoute[] {
  const { state, clock } = processor;
  return [
    {
      method: 'post',
      path: '/v1/customers',
      handle: ({ input }) => {
        const { payment_method: method, ...given } = readParameters(createParameters, input);
        const customer = newCustomer(clock.seconds());
        // A card that is refused leaves no customer behind, so it is attached before the customer is kept.
        if (method !== undefined) attachMethod(processor, usePaymentMethod(processor, method), customer);
        return keep(state.customers, edit(state, customer, given));
      },
    },
    {
      method: 'get',
      path: '/v1/customers',
      handle: ({ input }) => {
        const query = readParameters(listCustomers, input);
        const present = [...state.customers.values()].filter((customer) => !('deleted' in customer)) as Customer[];
        const found = present.filter((customer) => query.email === undefined || customer.email === query.email);
        return listPage(found, query, 'customer', '/v1/customers');
      },
    },
    {
      method: 'get',
      path: '/v1/customers/:customer',
      handle: ({ ids: { customer = '' } }) => {
        const found = state.customers.get(customer);
        if (!found) throw noSuch('customer', customer, 'customer', true);
        return found;
      },
    },
    {
      method: 'post',
      path: '/v1/customers/:customer',
      handle: ({ ids: { customer = '' }, input }) =>
        edit(state, findCustomer(state, customer, 'customer', true), readParameters(updateParameters, input)),
    },
    {
      method: 'delete',
      path: '/v1/customers/:customer',
      handle: ({ ids: { customer = '' } }) => {
        const { id } = findCustomer(state, customer, 'customer', true);
        for (const method of methodsOfCustomer(state, id)) method.customer = null;
        return keep(state.customers, { id, object: 'customer', deleted: true });
      },
    },
  ];
}
