import { orderTotals, type OrderLine, type OrderWithLines } from '@seamwright/ordering/domain';
import {
  formatKgWithUnit,
  formatMoney,
  formatPlantDate,
  grams,
  minorUnits,
  type CurrencyCode,
  type Quantity,
} from '@seamwright/shared/util';
import type { CardState } from './ports';

const WHEN_SHORT_WORDS: Readonly<Record<OrderLine['whenShort'], string>> = {
  'leave-off': $localize`leave it off when it falls short`,
  'send-what-there-is': $localize`send what there is when it falls short`,
  'ask-me': $localize`ask me when it falls short`,
};

function quantityWords(quantity: Quantity, pieces: number): string {
  switch (quantity.unit) {
    case 'piece':
      return $localize`${pieces}:pieces: × piece`;
    case 'case':
      return $localize`${quantity.count}:cases: × case (${pieces}:pieces: pieces)`;
    case 'kg':
      return quantity.notLess
        ? $localize`not less than ${formatKgWithUnit(quantity.grams)}:weight: (${pieces}:pieces: pieces)`
        : $localize`about ${formatKgWithUnit(quantity.grams)}:weight: (${pieces}:pieces: pieces)`;
  }
}

/** The confirmation of an order in words: its lines with weights and prices, the range, and what is held on the card. */
export function confirmationMail(
  order: OrderWithLines,
  recipient: { readonly name: string },
  card: CardState | undefined,
): { subject: string; text: string } {
  const money = (minor: number) => formatMoney(minorUnits(minor), order.currency as CurrencyCode);
  const per = { kg: $localize`per kg`, piece: $localize`per piece`, case: $localize`per case` };
  const lines = order.lines.flatMap((line) => [
    `${line.code}  ${line.name}${line.choiceSummary ? `, ${line.choiceSummary}` : ''}`,
    `    ${quantityWords(line.quantity, line.pieces)}, ${money(line.priceMinor)} ${per[line.basis]}`,
    $localize`    weight ${formatKgWithUnit(grams(line.minGrams))}:least: to ${formatKgWithUnit(grams(line.maxGrams))}:most:, most likely ${formatKgWithUnit(grams(line.estimateGrams))}:likely:: ${money(line.estimateMinor)}:amount:`,
    `    ${WHEN_SHORT_WORDS[line.whenShort]}${line.note ? ` · ${line.note}` : ''}`,
    '',
  ]);
  const { min, estimate, max } = orderTotals(order.lines, order.deliveryChargeMinor, order.deliveryTaxPpm);
  const day = formatPlantDate(order.deliveryDay, 'long');
  const settled = card
    ? $localize`${money(card.holdMinor)}:amount: is held on your card. You are charged for the real weight, and the rest is let go.`
    : $localize`It goes on your account: the invoice is for the real weight.`;
  return {
    subject: $localize`Order ${order.number}:number: is confirmed for ${day}:day:`,
    text: [
      $localize`Hello ${recipient.name}:name:,`,
      '',
      $localize`order ${order.number}:number: for ${order.siteName}:site: is confirmed for ${day}:day:.`,
      '',
      ...lines,
      $localize`Delivery: ${money(order.deliveryChargeMinor)}:amount:`,
      $localize`Tax, most likely: ${money(estimate.taxMinor)}:amount:`,
      $localize`Total: most likely ${money(estimate.totalMinor)}:likely:, between ${money(min.totalMinor)}:least: and ${money(max.totalMinor)}:most:.`,
      settled,
    ].join('\n'),
  };
}
