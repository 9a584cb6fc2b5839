// The key of chosen values alone: the basket, which every page of the storefront has, needs nothing else of the
// catalogue's rules and drawings.
export { choiceKey } from '../../src/choice-key';
