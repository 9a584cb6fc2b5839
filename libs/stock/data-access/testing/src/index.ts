export { aLotWire } from './a-lot-wire';
