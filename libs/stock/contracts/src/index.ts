export { getLot, holdLot, listLotNodes, listLots, receiveLot, releaseLot, type LotWire } from './lots.endpoints';
