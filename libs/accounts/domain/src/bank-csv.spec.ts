import { parseBankCsv } from './bank-csv';

const read = (text: string) => parseBankCsv(text, 'GBP');
const codes = (text: string) => read(text).faults.map(({ row, column, refusal }) => [row, column, refusal.code]);

describe('bank statement', () => {
  it('reads quoted fields, pounds, thousands and a byte order mark', () => {
    const { lines, faults } = read(
      '\uFEFFDate,Description,Reference,Amount\r\n' +
        '2026-12-04,"CARD PAYOUT, ""MAIN""",po_1,"£1,234.50"\r\n' +
        '4/12/2026,RENT,,-1200\r\n',
    );
    expect(faults).toEqual([]);
    expect(lines).toEqual([
      { lineNumber: 2, bookedOn: '2026-12-04', amountMinor: 123450, text: 'CARD PAYOUT, "MAIN"', reference: 'po_1' },
      { lineNumber: 3, bookedOn: '2026-12-04', amountMinor: -120000, text: 'RENT', reference: null },
    ]);
  });

  it('reads semicolons, decimal commas, and debit and credit in columns of their own', () => {
    const { lines } = read('date;description;debit;credit\n4 Dec 2026;Fee;1,50;\n04.12.2026;In;;"2.000,00"\n');
    expect(lines.map(({ amountMinor }) => amountMinor)).toEqual([-150, 200000]);
  });

  it('keeps a line break inside quotes, and counts lines of the file', () => {
    const { lines } = read('Date,Description,Amount\n2026-12-04,"two\nlines",1.00\n\n2026-12-05,x,2.00\n');
    expect(lines).toMatchObject([
      { lineNumber: 2, text: 'two\nlines' },
      { lineNumber: 5, amountMinor: 200 },
    ]);
  });

  it('names every bad cell by line and column, and keeps the good lines apart', () => {
    const text =
      'Date,Description,Amount\n31/02/2026,a,1.00\n2026-12-04,b,abc\n2026-12-04,c,0.00\n2026-12-04,d,1.005\n2026-12-04,e,5\n';
    expect(codes(text)).toEqual([
      [2, 'Date', 'statement-date'],
      [3, 'Amount', 'statement-amount'],
      [4, 'Amount', 'statement-amount-zero'],
      [5, 'Amount', 'statement-amount'],
    ]);
    expect(read(text).lines).toHaveLength(1);
  });

  it('refuses both sides, and neither', () => {
    expect(codes('Date,Description,Debit,Credit\n2026-12-04,a,1,2\n2026-12-04,b,,\n')).toEqual([
      [2, 'Debit', 'statement-both-sides'],
      [3, 'Credit', 'statement-no-amount'],
    ]);
  });

  it.each([
    ['nothing', '', 'statement-empty'],
    ['a head only', 'Date,Description,Amount\n', 'statement-empty'],
    ['no amount', 'Date,Description\n2026-12-04,a\n', 'statement-column-missing'],
    ['a credit without debit', 'Date,Description,Credit\n2026-12-04,a,1\n', 'statement-column-missing'],
    ['a quote without end', 'Date,Description,Amount\n2026-12-04,"a,1\n', 'statement-unreadable'],
  ])('refuses %s as a whole', (_what, text, code) => {
    expect(codes(text)).toEqual([[null, null, code]]);
  });
});
