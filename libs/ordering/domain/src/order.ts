import type { PriceAnswer, PriceBasis } from '@seamwright/pricing/domain';
import type { Grams, PlantDate, Quantity } from '@seamwright/shared/util';
import type { WhenShort } from './when-short';

/** A line as it was placed: its version, weights and price never change afterwards. */
export interface OrderLine {
  readonly id: string;
  readonly orderId: string;
  readonly position: number;
  readonly specificationId: string;
  readonly versionId: string;
  readonly code: string;
  readonly name: string;
  /** The number of the version. */
  readonly version: number;
  readonly chosen: Readonly<Record<string, string>>;
  readonly choiceKey: string;
  /** The choices in words, as they were agreed. */
  readonly choiceSummary: string;
  readonly quantity: Quantity;
  readonly pieces: number;
  readonly minGrams: Grams;
  readonly estimateGrams: Grams;
  readonly maxGrams: Grams;
  readonly basis: PriceBasis;
  /** Per kg, piece or case, as the basis says. */
  readonly priceMinor: number;
  readonly priceWhy: PriceAnswer;
  readonly taxPpm: number;
  readonly minMinor: number;
  readonly estimateMinor: number;
  readonly maxMinor: number;
  readonly whenShort: WhenShort;
  readonly note: string;
  readonly shortPieces: number;
  readonly shortReason: string | null;
}

/** How an order came in. */
export type OrderSource = 'storefront' | 'desk' | 'import';
export type Settlement = 'card' | 'account';

/** An order without its lines. */
export interface Order {
  readonly id: string;
  readonly rowVersion: number;
  readonly number: number;
  readonly customerId: string;
  readonly customerName: string;
  readonly siteId: string;
  readonly siteName: string;
  readonly deliveryDay: PlantDate;
  readonly source: OrderSource;
  readonly settlement: Settlement;
  readonly waitingFor: readonly string[];
  readonly currency: string;
  readonly customerReference: string;
  readonly note: string;
  readonly deliveryChargeMinor: number;
  readonly deliveryTaxPpm: number;
  readonly placedAt: Date;
  readonly placedBy: string | null;
  /** Null when it was not a person, or is one that the asker does not see. */
  readonly placedByName: string | null;
  readonly releasedAt: Date | null;
  readonly packedAt: Date | null;
  readonly cancelledAt: Date | null;
  readonly cancelledBecause: string | null;
}

export interface OrderWithLines extends Order {
  /** In the order of their positions. */
  readonly lines: readonly OrderLine[];
}
