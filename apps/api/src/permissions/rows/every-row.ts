import type { Row } from '../row';
import { accountsRows } from './accounts.rows';
import { catalogueRows } from './catalogue.rows';
import { cuttingRows } from './cutting.rows';
import { identityRows } from './identity.rows';
import { orderingRows } from './ordering.rows';
import { plantRows } from './plant.rows';
import { pricingRows } from './pricing.rows';
import { stockRows } from './stock.rows';

/** One row for each endpoint of the house. */
export const everyRow: readonly Row[] = [
  ...identityRows,
  ...catalogueRows,
  ...cuttingRows,
  ...pricingRows,
  ...stockRows,
  ...orderingRows,
  ...plantRows,
  ...accountsRows,
];
