import type { MinorUnits, PlantDate } from '@seamwright/shared/util';

/** Where the vans go, on which weekdays, and until when one may order. */
export interface DeliveryZone {
  readonly id: string;
  readonly name: string;
  /** ISO weekdays of delivery: 1 Monday to 7 Sunday. */
  readonly weekdays: readonly number[];
  /** HH:MM on the plant's clock. */
  readonly cutOffTime: string;
  /** Working days between the last day to order and the delivery day. */
  readonly leadDays: number;
  readonly deliveryChargeMinor: MinorUnits;
}

/** Days on which the plant neither cuts nor delivers. */
export type Closures = ReadonlySet<PlantDate>;
