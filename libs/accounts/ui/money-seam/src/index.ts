// The drawing stands apart from the other pieces, so that it is loaded only where it is shown.
export { MoneySeam } from '../../src/money-seam/money-seam';
export type { MoneyFlow } from '../../src/money-seam/money-flow';
