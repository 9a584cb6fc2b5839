export { aDay, aPackingLine, aPackingOrder, somePapers } from './a-day';
