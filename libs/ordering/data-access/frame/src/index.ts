// What the storefront's frame needs of ordering, and no endpoint: the first load carries nothing that only pages use.
export { BasketActions } from '../../src/basket/basket.actions';
export { basketFeature } from '../../src/basket/basket.feature';
export { basketRestored } from '../../src/basket/basket.guards';
export { provideBasket } from '../../src/basket/provide-basket';
