import fc from 'fast-check';
import type { ImportRow } from './import-columns';
import { groupRows, MOST_LINES } from './import-grouping';

const aRow = (row: number, stated: Partial<ImportRow> = {}): ImportRow => ({
  row,
  customer: 'The Heron Rooms',
  site: 'Kitchen',
  day: '2026-12-03',
  code: 'BF-901',
  choices: '',
  quantity: '10',
  unit: 'piece',
  whenShort: '',
  note: '',
  ...stated,
});
const codes = (...rows: ImportRow[]) =>
  groupRows(rows).faults.map(({ row, column, code }) => `${column}${row} ${code}`);

describe('rows of a workbook', () => {
  it('make one order for each customer and day, whatever the capitals and spaces', () => {
    const { orders, faults } = groupRows([
      aRow(2),
      aRow(3, { day: '4/12/2026' }),
      aRow(4, { customer: ' the  HERON rooms ', code: 'lm-204' }),
      aRow(5, { customer: 'Quayside Canteen', site: '' }),
    ]);
    expect(faults).toEqual([]);
    expect(orders.map(({ customer, day, lines }) => [customer, day, lines.map(({ code }) => code)])).toEqual([
      ['The Heron Rooms', '2026-12-03', ['BF-901', 'LM-204']],
      ['The Heron Rooms', '2026-12-04', ['BF-901']],
      ['Quayside Canteen', '2026-12-03', ['BF-901']],
    ]);
  });

  it('are read as choices, quantities by piece, case and kg, and what to do when short', () => {
    const { orders } = groupRows([
      aRow(2, { choices: 'trim=6; portion = 280', whenShort: 'Ask me' }),
      aRow(3, { quantity: '2', unit: 'Cases', whenShort: 'leave-off' }),
      aRow(4, { quantity: '12,5', unit: 'kg' }),
    ]);
    expect(orders[0]?.lines).toEqual([
      expect.objectContaining({
        chosen: { trim: '6', portion: '280' },
        quantity: { unit: 'piece', count: 10 },
        whenShort: 'ask-me',
      }),
      expect.objectContaining({ quantity: { unit: 'case', count: 2 }, whenShort: 'leave-off' }),
      expect.objectContaining({
        quantity: { unit: 'kg', grams: 12_500, notLess: false },
        whenShort: 'send-what-there-is',
      }),
    ]);
  });

  it('name every faulty cell and leave the whole row out', () => {
    const bad = aRow(7, { day: '31/2/2026', choices: 'trim', quantity: '-3', whenShort: 'maybe' });
    expect(codes(bad)).toEqual([
      'C7 date-unreadable',
      'E7 choices-unreadable',
      'F7 quantity-not-positive',
      'H7 when-short-unknown',
    ]);
    expect(codes(aRow(2, { quantity: '1.5' }), aRow(3, { quantity: 'ten' }), aRow(4, { unit: 'box' }))).toEqual([
      'F2 quantity-not-whole',
      'F3 quantity-unreadable',
      'G4 unit-unknown',
    ]);
    expect(codes(aRow(2, { quantity: '0.0005', unit: 'kg' }), aRow(3, { quantity: '-1', unit: 'kg' }))).toEqual([
      'F2 quantity-unreadable',
      'F3 quantity-not-positive',
    ]);
    expect(codes(aRow(2, { choices: 'trim=6;trim=3' }))).toEqual(['E2 choices-unreadable']);
  });

  it('for one customer and day go to one site', () => {
    expect(codes(aRow(2), aRow(3, { site: 'Annexe' }), aRow(4, { site: 'Annexe', day: '2026-12-04' }))).toEqual([
      'B3 another-site-that-day',
    ]);
  });

  it('fill an order up to its most lines', () => {
    const rows = Array.from({ length: MOST_LINES + 1 }, (_, at) => aRow(at + 2));
    expect(codes(...rows)).toEqual([`A${MOST_LINES + 2} too-many-lines`]);
  });

  it('each come back in exactly one order or with a fault, whatever was typed', () => {
    const text = fc.oneof(fc.string({ maxLength: 12 }), fc.constantFrom('', '10', 'kg', 'piece', '2026-12-03', 'a=b'));
    const cells = fc.record({ customer: text, site: text, day: text, code: text, choices: text, quantity: text });
    const rest = fc.record({ unit: text, whenShort: text, note: text });
    fc.assert(
      fc.property(fc.array(fc.tuple(cells, rest), { maxLength: 30 }), (typed) => {
        const rows = typed.map(([one, other], at) => ({ row: at + 2, ...one, ...other }));
        const { orders, faults } = groupRows(rows);
        const taken = orders.flatMap(({ lines }) => lines.map(({ row }) => row));
        const refused = [...new Set(faults.map(({ row }) => row))];
        expect([...taken, ...refused].sort((a, b) => a - b)).toEqual(rows.map(({ row }) => row));
      }),
    );
  });
});
