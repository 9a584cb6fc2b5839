import PDFDocument from 'pdfkit';
import type { InvoiceLine } from '@seamwright/accounts/domain';
import {
  formatCreditorReference,
  formatKg,
  formatPercent,
  formatPlantDate,
  type PlantDate,
} from '@seamwright/shared/util';
import { moneyOn, paymentWords, type InvoicePaper } from './invoice-paper';
import { paperFonts } from './paper-fonts';

const MARGIN = 48;
const RIGHT = 595.28 - MARGIN;
const BOTTOM = 841.89 - 64;
const INK = '#1E2529';
const SOFT = '#4A5459';
const LINE = '#C9CDC8';

interface Column {
  readonly head: string;
  readonly x: number;
  readonly width: number;
  readonly align: 'left' | 'right';
  text(line: InvoiceLine): string;
}

type Paper = InstanceType<typeof PDFDocument>;

/** The invoice as a paper: A4, searchable text, as many pages as it needs, the table's head on each. */
export async function invoicePdf(paper: InvoicePaper): Promise<Buffer> {
  const title = $localize`Invoice ${paper.number}:number:`;
  const doc = new PDFDocument({
    size: 'A4',
    margin: 0,
    bufferPages: true,
    lang: 'en-GB',
    info: { Title: title, Author: paper.seller.name, CreationDate: new Date(`${paper.issuedOn}T12:00:00Z`) },
  });
  for (const [name, font] of Object.entries(paperFonts())) doc.registerFont(name, font);
  const chunks: Buffer[] = [];
  doc.on('data', (chunk: Buffer) => chunks.push(chunk));
  const done = new Promise<Buffer>((resolve, reject) => {
    doc.on('end', () => resolve(Buffer.concat(chunks)));
    doc.on('error', reject);
  });
  doc.fillColor(INK);
  const columns = columnsOf(paper);
  const after = drawLines(doc, paper, columns, drawHead(doc, paper, title));
  drawFoot(doc, paper, after);
  numberPages(doc, title);
  doc.end();
  return done;
}

const long = (day: string): string => formatPlantDate(day as PlantDate, 'long');

function say(
  doc: Paper,
  text: string,
  x: number,
  y: number,
  { size = 9, bold = false, width = 240, align = 'left' as 'left' | 'right', soft = false } = {},
): number {
  doc
    .font(bold ? 'Sans-Bold' : 'Sans')
    .fontSize(size)
    .fillColor(soft ? SOFT : INK);
  const height = doc.heightOfString(text || ' ', { width });
  doc.text(text, x, y, { width, align });
  return y + height;
}

function rule(doc: Paper, y: number): void {
  doc.moveTo(MARGIN, y).lineTo(RIGHT, y).lineWidth(0.5).strokeColor(LINE).stroke();
}

function drawHead(doc: Paper, paper: InvoicePaper, title: string): number {
  const { seller, customer, order } = paper;
  say(doc, title, MARGIN, MARGIN, { size: 20, bold: true });
  const right = { width: 220, align: 'right' } as const;
  let y = say(doc, seller.name, RIGHT - 220, MARGIN, { ...right, size: 11, bold: true });
  y = say(doc, seller.address, RIGHT - 220, y + 2, { ...right, soft: true });
  y = say(doc, $localize`VAT number ${seller.vatNumber}:number:`, RIGHT - 220, y + 2, { ...right, soft: true });
  const top = Math.max(y, MARGIN + 40) + 18;
  let left = say(doc, customer.name, MARGIN, top, { size: 11, bold: true });
  left = say(doc, customer.billingAddress, MARGIN, left + 2);
  if (customer.vatNumber)
    left = say(doc, $localize`VAT number ${customer.vatNumber}:number:`, MARGIN, left + 2, { soft: true });
  const facts: [string, string][] = [
    [$localize`Customer`, String(customer.number)],
    [$localize`Order`, String(order.number)],
    ...(order.customerReference ? ([[$localize`Your reference`, order.customerReference]] as [string, string][]) : []),
    [$localize`Delivered to`, order.siteName],
    [$localize`Delivery day`, long(paper.deliveryDay)],
    [$localize`Invoice date`, long(paper.issuedOn)],
    [$localize`Due`, long(paper.dueOn)],
    [$localize`Payment reference`, formatCreditorReference(paper.reference)],
  ];
  let at = top;
  for (const [name, value] of facts) {
    say(doc, name, 310, at, { soft: true, width: 90 });
    at = say(doc, value, 400, at, { width: RIGHT - 400, align: 'right' }) + 1;
  }
  return Math.max(left, at) + 16;
}

function columnsOf(paper: InvoicePaper): Column[] {
  const money = moneyOn(paper);
  const per = { kg: $localize`/kg`, piece: $localize`/piece`, case: $localize`/case`, delivery: '' };
  const count = (whole: number): string => (whole > 0 ? String(whole) : '');
  return [
    { head: $localize`Description`, x: MARGIN, width: 190, align: 'left', text: ({ description }) => description },
    { head: $localize`Packs`, x: 242, width: 34, align: 'right', text: ({ packs }) => count(packs) },
    { head: $localize`Pieces`, x: 278, width: 36, align: 'right', text: ({ pieces }) => count(pieces) },
    {
      head: $localize`Net kg`,
      x: 316,
      width: 50,
      align: 'right',
      text: ({ netGrams }) => (netGrams > 0 ? formatKg(netGrams) : ''),
    },
    {
      head: $localize`Price`,
      x: 368,
      width: 74,
      align: 'right',
      text: ({ priceMinor, basis }) => `${money(priceMinor)}${per[basis]}`,
    },
    { head: $localize`Tax`, x: 444, width: 32, align: 'right', text: ({ taxPpm }) => formatPercent(taxPpm) },
    { head: $localize`Amount`, x: 478, width: RIGHT - 478, align: 'right', text: ({ netMinor }) => money(netMinor) },
  ];
}

function drawTableHead(doc: Paper, columns: readonly Column[], y: number): number {
  for (const { head, x, width, align } of columns) say(doc, head, x, y, { width, align, bold: true, soft: true });
  rule(doc, y + 14);
  return y + 19;
}

function drawLines(doc: Paper, paper: InvoicePaper, columns: readonly Column[], top: number): number {
  let y = drawTableHead(doc, columns, top);
  for (const line of paper.lines) {
    doc.font('Sans').fontSize(9);
    const height = Math.max(...columns.map((column) => doc.heightOfString(column.text(line) || ' ', column)));
    if (y + height > BOTTOM) {
      doc.addPage();
      y = drawTableHead(doc, columns, MARGIN);
    }
    for (const { text, x, width, align } of columns) say(doc, text(line), x, y, { width, align });
    y += height + 4;
  }
  rule(doc, y);
  return y + 8;
}

function drawFoot(doc: Paper, paper: InvoicePaper, top: number): void {
  const money = moneyOn(paper);
  const { taxes, netMinor, taxMinor, totalMinor } = paper.total;
  const words = paymentWords(paper, long(paper.dueOn));
  const needed = 70 + taxes.length * 14 + words.length * 14;
  let y = top;
  if (y + needed > BOTTOM) {
    doc.addPage();
    y = MARGIN;
  }
  const row = (name: string, minor: number, bold = false): void => {
    const style = { bold, size: bold ? 11 : 9 };
    say(doc, name, 330, y, { ...style, width: 130 });
    y = say(doc, money(minor), 440, y, { ...style, width: RIGHT - 440, align: 'right' }) + 2;
  };
  const start = y;
  row($localize`Net`, netMinor);
  row($localize`Tax`, taxMinor);
  row($localize`Total`, totalMinor, true);
  let left = drawTaxes(doc, paper, start);
  left = Math.max(left, y) + 12;
  for (const text of words) left = say(doc, text, MARGIN, left, { size: 10, width: RIGHT - MARGIN }) + 2;
  const { bankDetails } = paper.seller;
  const reference = formatCreditorReference(paper.reference);
  const how = $localize`Pay to ${bankDetails}:bank:, reference ${reference}:reference:`;
  say(doc, how, MARGIN, left + 2, { width: RIGHT - MARGIN, soft: true });
}

/** The tax by rate, on the sum of its lines. */
function drawTaxes(doc: Paper, paper: InvoicePaper, top: number): number {
  const money = moneyOn(paper);
  const cells = [
    { x: MARGIN, width: 60 },
    { x: 110, width: 70 },
    { x: 182, width: 70 },
  ] as const;
  const row = (texts: readonly [string, string, string], y: number, bold: boolean): number => {
    texts.forEach((text, at) => {
      const { x, width } = cells[at] ?? cells[0];
      say(doc, text, x, y, { width, align: 'right', bold, soft: bold });
    });
    return y + 14;
  };
  let y = row([$localize`Tax rate`, $localize`On`, $localize`Tax`], top, true);
  for (const { taxPpm, netMinor, taxMinor } of paper.total.taxes)
    y = row([formatPercent(taxPpm), money(netMinor), money(taxMinor)], y, false);
  return y;
}

function numberPages(doc: Paper, title: string): void {
  const { count } = doc.bufferedPageRange();
  for (let page = 0; page < count; page++) {
    doc.switchToPage(page);
    const text = $localize`${title}:title: · page ${page + 1}:page: of ${count}:count:`;
    say(doc, text, MARGIN, BOTTOM + 24, { size: 8, width: RIGHT - MARGIN, align: 'right', soft: true });
  }
}
