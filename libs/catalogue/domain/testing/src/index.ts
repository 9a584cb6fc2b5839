export { aChoice, aValue } from './a-choice';
export { aContent, aVersion } from './a-version';
