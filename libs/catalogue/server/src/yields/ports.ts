import type { Tx } from '@seamwright/shared/server';
import type { PlantDate } from '@seamwright/shared/util';

/** What higher storeys make of yields: how much of it reads those of these specifications from a day on. */
export interface YieldReadersPort {
  countPriceLines(tx: Tx, specificationIds: readonly string[], from: PlantDate): Promise<number>;
  countOpenOrderLines(tx: Tx, specificationIds: readonly string[], from: PlantDate): Promise<number>;
}

export interface YieldParts {
  readonly timeZone: string;
  readonly readers: YieldReadersPort;
}
