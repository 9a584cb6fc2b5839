export { NextDelivery } from './next-delivery';
