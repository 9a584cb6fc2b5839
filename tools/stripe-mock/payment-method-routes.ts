import * as z from 'zod';
import type { ApiRoute } from './api-route';
import { findCustomer } from './customers';
import { invalidParameter, refused } from './errors';
import { listPage, listParameters } from './lists';
import { readParameters, text } from './parameters';
import { attachMethod, findPaymentMethod, methodFor, methodsOfCustomer, usePaymentMethod } from './payment-methods';
import type { Processor } from './processor';
import { testCard } from './test-cards';

const attachParameters = z.strictObject({ customer: text });
const noParameters = z.strictObject({});
const methodFilter = { type: z.enum(['card']).optional() };
const listMethods = z.strictObject({ ...listParameters, ...methodFilter, customer: text });
const listOfCustomer = z.strictObject({ ...listParameters, ...methodFilter });

/** Looking at cards, saving them to a customer and letting them go. */
export function paymentMethodRoutes(processor: Processor): ApiRoute[] {
  const { state, clock } = processor;
  return [
    {
      method: 'post',
      path: '/v1/payment_methods',
      handle: () => {
        throw invalidParameter(
          'Card numbers never pass this server: use the documented test methods by their ids.',
          'card',
        );
      },
    },
    {
      method: 'get',
      path: '/v1/payment_methods',
      handle: ({ input }) => {
        const query = readParameters(listMethods, input);
        const { id } = findCustomer(state, query.customer, 'customer');
        return listPage(methodsOfCustomer(state, id), query, 'PaymentMethod', '/v1/payment_methods');
      },
    },
    {
      method: 'get',
      path: '/v1/payment_methods/:method',
      handle: ({ ids: { method = '' } }) => {
        const card = testCard(method);
        return card ? methodFor(card, method, clock.now()) : findPaymentMethod(state, method, 'payment_method', true);
      },
    },
    {
      method: 'post',
      path: '/v1/payment_methods/:method/attach',
      handle: ({ ids: { method = '' }, input }) => {
        const customer = findCustomer(state, readParameters(attachParameters, input).customer, 'customer');
        return attachMethod(processor, usePaymentMethod(processor, method, 'payment_method', true), customer);
      },
    },
    {
      method: 'post',
      path: '/v1/payment_methods/:method/detach',
      handle: ({ ids: { method: id = '' }, input }) => {
        readParameters(noParameters, input);
        const method = findPaymentMethod(state, id, 'payment_method', true);
        if (method.customer === null) {
          throw refused('The payment method you provided is not attached to a customer so detachment is impossible.', {
            param: 'payment_method',
          });
        }
        const owner = findCustomer(state, method.customer, 'customer');
        if (owner.invoice_settings.default_payment_method === id) owner.invoice_settings.default_payment_method = null;
        method.customer = null;
        return method;
      },
    },
    {
      method: 'get',
      path: '/v1/customers/:customer/payment_methods',
      handle: ({ ids: { customer = '' }, input }) => {
        const { id } = findCustomer(state, customer, 'customer', true);
        const query = readParameters(listOfCustomer, input);
        return listPage(methodsOfCustomer(state, id), query, 'PaymentMethod', `/v1/customers/${id}/payment_methods`);
      },
    },
  ];
}
