import type { QuoteDetail } from '@seamwright/pricing/contracts';
import { HOUSE_CURRENCY, type PriceBasis } from '@seamwright/pricing/domain';
import {
  formatKgWithUnit,
  formatMoney,
  formatPlantDate,
  grams,
  isPlantDate,
  minorUnits,
} from '@seamwright/shared/util';

const money = (minor: number): string => formatMoney(minorUnits(minor), HOUSE_CURRENCY);
const day = (text: string): string => (isPlantDate(text) ? formatPlantDate(text, 'long') : text);

const per = (basis: PriceBasis, price: string): string => {
  switch (basis) {
    case 'kg':
      return $localize`${price}:price: per kg`;
    case 'piece':
      return $localize`${price}:price: per piece`;
    case 'case':
      return $localize`${price}:price: per case`;
  }
};

function lineText({ code, name, summary, basis, priceMinor, caseWeights, caseAmounts }: QuoteDetail['lines'][number]) {
  const what = summary === '' ? `${name} (${code})` : `${name} (${code}), ${summary}`;
  const weight = formatKgWithUnit(grams(caseWeights.estimateGrams));
  const amount = money(caseAmounts.estimateMinor);
  return [
    `${what}: ${per(basis, money(priceMinor))}`,
    `  ${$localize`a case weighs about ${weight}:weight: and costs about ${amount}:amount:`}`,
  ].join('\n');
}

/** The quote in words, as it is mailed to the customer. `link` leads to its page. */
export function quoteMail(quote: QuoteDetail, link: string): { subject: string; text: string } {
  const { number, customerName, pricesFrom, pricesUntil, answerBy, notes, writtenBy, lines } = quote;
  return {
    subject: $localize`Quote ${number}:number: for ${customerName}:customer:`,
    text: [
      $localize`Our prices for deliveries from ${day(pricesFrom)}:from: to ${day(pricesUntil)}:until::`,
      lines.map(lineText).join('\n\n'),
      ...(notes === '' ? [] : [notes]),
      $localize`Please answer by ${day(answerBy)}:day:. Once you accept, these prices are used for your next orders:`,
      link,
      writtenBy,
    ].join('\n\n'),
  };
}
