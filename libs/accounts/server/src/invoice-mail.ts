import { formatCreditorReference, formatPlantDate, type PlantDate } from '@seamwright/shared/util';
import { moneyOn, paymentWords, type InvoicePaper } from './invoice-paper';

/** The mail that brings an invoice. */
export function invoiceMail(paper: InvoicePaper): { subject: string; text: string } {
  const long = (day: string): string => formatPlantDate(day as PlantDate, 'long');
  const { number, order, deliveryDay, total } = paper;
  return {
    subject: $localize`Invoice ${number}:number: for ${long(deliveryDay)}:day:`,
    text: [
      $localize`Invoice ${number}:number: for order ${order.number}:order:, delivered to ${order.siteName}:site: on ${long(deliveryDay)}:day:, is attached.`,
      '',
      $localize`Total: ${moneyOn(paper)(total.totalMinor)}:amount:`,
      ...paymentWords(paper, long(paper.dueOn)),
      $localize`Payment reference: ${formatCreditorReference(paper.reference)}:reference:`,
      '',
      paper.seller.name,
    ].join('\n'),
  };
}
