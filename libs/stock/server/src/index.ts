export { addPack, voidPack } from './add-pack';
export { lotById } from './lots.repository';
export { lotsOf } from './lots-for-day';
export { stockImplementations, type StockParts } from './lots.router';
export { stockPort } from './stock-port';
export { packById, packsOfOrders, type NewPack } from './packs.repository';
