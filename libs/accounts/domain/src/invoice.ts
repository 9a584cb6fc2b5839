import { packedAmount, totalOf, type OrderWithLines, type Total } from '@seamwright/ordering/domain';
import { grams, minorUnits, ppm, type Grams, type MinorUnits, type Ppm } from '@seamwright/shared/util';
import type { PackedLine } from '@seamwright/stock/domain';

export const INVOICE_BASES = ['kg', 'piece', 'case', 'delivery'] as const;
export type InvoiceBasis = (typeof INVOICE_BASES)[number];

/** One line of an invoice: what left in packs, or the delivery. Money in minor units, without tax. */
export interface InvoiceLine {
  readonly position: number;
  readonly orderLineId: string | null;
  readonly description: string;
  readonly packs: number;
  readonly pieces: number;
  readonly netGrams: Grams;
  readonly basis: InvoiceBasis;
  /** Grams when sold by weight, pieces when sold by piece or case, 1 for a delivery. */
  readonly quantity: number;
  /** Per kg, piece, case or delivery. */
  readonly priceMinor: MinorUnits;
  readonly taxPpm: Ppm;
  readonly netMinor: MinorUnits;
}

export interface InvoiceDraft {
  readonly lines: readonly InvoiceLine[];
  /** Tax per rate on the sum of its lines, half up. */
  readonly total: Total;
}

type OrderToInvoice = Pick<OrderWithLines, 'lines' | 'deliveryChargeMinor' | 'deliveryTaxPpm'>;

/** Net, tax and total of invoice lines. */
export const invoiceTotal = (lines: readonly Pick<InvoiceLine, 'netMinor' | 'taxPpm'>[]): Total =>
  totalOf(lines.map(({ netMinor, taxPpm }) => ({ minor: netMinor, taxPpm })));

/**
 * The invoice for what was packed of an order: one line per order line that has packs, and the delivery charge where
 * there is one. Null when nothing was packed: then there is nothing to charge. `packs` by order line id.
 */
export function invoiceFromPacks(
  order: OrderToInvoice,
  packs: ReadonlyMap<string, Pick<PackedLine, 'pieces' | 'netGrams'> & { readonly packs: { readonly length: number } }>,
  deliveryText: string,
): InvoiceDraft | null {
  const goods = order.lines.flatMap((line) => {
    const packed = packs.get(line.id);
    if (!packed || packed.pieces === 0) return [];
    const { code, name, choiceSummary, basis } = line;
    return [
      {
        orderLineId: line.id,
        description: choiceSummary ? `${code} ${name}, ${choiceSummary}` : `${code} ${name}`,
        packs: packed.packs.length,
        pieces: packed.pieces,
        netGrams: packed.netGrams,
        basis,
        quantity: basis === 'kg' ? packed.netGrams : packed.pieces,
        priceMinor: minorUnits(line.priceMinor),
        taxPpm: ppm(line.taxPpm),
        netMinor: packedAmount(line, { pieces: packed.pieces, grams: packed.netGrams }),
      },
    ];
  });
  if (goods.length === 0) return null;
  const charge = minorUnits(order.deliveryChargeMinor);
  const delivery = {
    orderLineId: null,
    description: deliveryText,
    packs: 0,
    pieces: 0,
    netGrams: grams(0),
    basis: 'delivery' as const,
    quantity: 1,
    priceMinor: charge,
    taxPpm: ppm(order.deliveryTaxPpm),
    netMinor: charge,
  };
  const lines = [...goods, ...(charge > 0 ? [delivery] : [])].map((line, at) => ({ position: at + 1, ...line }));
  return { lines, total: invoiceTotal(lines) };
}
