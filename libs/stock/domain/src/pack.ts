import type { Grams } from '@seamwright/shared/util';

/** One weighed pack for one order line. A voided pack counts for nothing. */
export interface Pack {
  readonly id: string;
  readonly serial: number;
  readonly customerId: string;
  readonly orderId: string;
  readonly orderLineId: string;
  readonly versionId: string;
  readonly lotId: string | null;
  readonly lotCode: string | null;
  readonly pieces: number;
  readonly netGrams: Grams;
  readonly tareGrams: Grams;
  readonly outOfLimits: boolean;
  readonly reason: string | null;
  readonly packedAt: Date;
  readonly packedBy: string;
}

/** What was packed for one order line: its packs and their sums. */
export interface PackedLine {
  readonly orderId: string;
  readonly orderLineId: string;
  readonly packs: readonly Pack[];
  readonly pieces: number;
  readonly netGrams: Grams;
}
