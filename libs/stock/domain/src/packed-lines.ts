import { grams } from '@seamwright/shared/util';
import type { Pack, PackedLine } from './pack';

/** Adds packs up by order line; a line without a pack is not among them. */
export function packedLines(packs: readonly Pack[]): Map<string, PackedLine> {
  const lines = new Map<string, PackedLine>();
  for (const pack of packs) {
    const before = lines.get(pack.orderLineId);
    lines.set(pack.orderLineId, {
      orderId: pack.orderId,
      orderLineId: pack.orderLineId,
      packs: [...(before?.packs ?? []), pack],
      pieces: (before?.pieces ?? 0) + pack.pieces,
      netGrams: grams((before?.netGrams ?? 0) + pack.netGrams),
    });
  }
  return lines;
}
