import { ok, refuse, type PlantDate, type Result } from '@seamwright/shared/util';

export const ORDER_STAGES = ['waiting', 'confirmed', 'released', 'in-work', 'packed', 'done', 'cancelled'] as const;
export type OrderStage = (typeof ORDER_STAGES)[number];

/** What an order can wait for before it counts as confirmed. */
export type WaitingFor = 'payment' | 'promise' | 'credit';

/** What is known of an order and its lines; its stage follows from it. */
export interface OrderFacts {
  readonly waitingFor: readonly string[];
  readonly releasedAt: Date | string | null;
  readonly packedAt: Date | string | null;
  readonly cancelledAt: Date | string | null;
  readonly deliveryDay: PlantDate | string;
  /** Something of it is in a pack or was marked short. */
  readonly begun: boolean;
}

/**
 * Where an order stands on `today` (the plant's day). An order is done when it was packed and its delivery day is over.
 */
export function orderStage(facts: OrderFacts, today: PlantDate): OrderStage {
  if (facts.cancelledAt) return 'cancelled';
  if (facts.packedAt) return today > facts.deliveryDay ? 'done' : 'packed';
  if (facts.waitingFor.length > 0) return 'waiting';
  if (!facts.releasedAt) return 'confirmed';
  return facts.begun ? 'in-work' : 'released';
}

export interface Amending {
  readonly stage: OrderStage;
  readonly cutOffAt: Date;
  readonly now: Date;
  readonly by: 'buyer' | 'desk';
}

/**
 * Whether an order can still be changed or cancelled: by the buyer until cut-off, by the desk until it is released to
 * the floor. Refuses with `order-settled` (stage) or `cut-off-passed-for-change`.
 */
export function checkAmendable({ stage, cutOffAt, now, by }: Amending): Result<true> {
  if (stage !== 'waiting' && stage !== 'confirmed') return refuse('order-settled', { stage });
  if (by === 'buyer' && now >= cutOffAt) return refuse('cut-off-passed-for-change');
  return ok(true);
}
