import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { ChangeDetectionStrategy, Component, LOCALE_ID, signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { DataTable } from './data-table';
import { DataTableHarness } from './data-table.harness';
import { TableCell } from './table-cell';
import type { TableColumn } from './table-column';

interface Pull {
  readonly lot: string;
  readonly day: string | null;
  readonly weightGrams: number;
  readonly costMinor: number;
}

const pulls: Pull[] = [
  { lot: 'L-10', day: '2026-12-06', weightGrams: 17_000, costMinor: 18_250 },
  { lot: 'L-9', day: null, weightGrams: 498_000, costMinor: 241_870 },
  { lot: 'L-11', day: '2026-12-04', weightGrams: 51_800, costMinor: 42_310 },
];

@Component({
  imports: [DataTable, TableCell],
  template: `
    <sw-data-table
      label="Pull list"
      [columns]="columns"
      [rows]="rows()"
      [rowId]="idOf"
      [rowLink]="linkOf"
      [totals]="totals"
      [loading]="loading()"
      [wide]="wide()"
    >
      <ng-template swCell="state" let-row>{{ row.weightGrams > 400000 ? 'large' : 'small' }}</ng-template>
    </sw-data-table>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Host {
  readonly rows = signal<readonly Pull[]>(pulls);
  readonly loading = signal(false);
  readonly wide = signal(false);
  readonly columns: TableColumn<Pull>[] = [
    { key: 'lot', label: 'Lot', kind: 'code', sortable: true },
    { key: 'day', label: 'Use by', kind: 'date', sortable: true },
    { key: 'weight', label: 'Weight, kg', kind: 'kg', value: (row) => row.weightGrams, sortable: true },
    { key: 'costMinor', label: 'Cost', kind: 'money' },
    { key: 'state', label: 'State', kind: 'template' },
  ];
  readonly totals = { weight: 566_800, costMinor: 302_430 };
  readonly idOf = (row: Pull): string => row.lot;
  readonly linkOf = (row: Pull): string[] => ['/lots', row.lot];
}

async function drawn() {
  TestBed.configureTestingModule({ providers: [provideRouter([]), { provide: LOCALE_ID, useValue: 'en-GB' }] });
  const fixture = TestBed.createComponent(Host);
  const table = await TestbedHarnessEnvironment.loader(fixture).getHarness(DataTableHarness);
  const root: HTMLElement = fixture.nativeElement;
  return { fixture, host: fixture.componentInstance, root, table };
}

const firsts = async (table: DataTableHarness): Promise<(string | undefined)[]> =>
  (await table.rows()).map(([first]) => first);

describe('DataTable', () => {
  it('writes each value as its column says, and the totals given', async () => {
    const { table } = await drawn();

    expect(await table.heads()).toEqual(['Lot', 'Use by', 'Weight, kg', 'Cost', 'State']);
    expect((await table.rows()).slice(0, 2)).toEqual([
      ['L-10', 'Sun 6 Dec', '17.000', '£182.50', 'small'],
      ['L-9', '', '498.000', '£2,418.70', 'large'],
    ]);
    expect(await table.totals()).toEqual(['Total', '', '566.800', '£3,024.30', '']);
  });

  it('sorts codes by their numbers and turns round when asked again', async () => {
    const { root, table } = await drawn();
    await table.sortBy('Lot');
    expect(await firsts(table)).toEqual(['L-9', 'L-10', 'L-11']);
    expect(root.querySelector('th')?.getAttribute('aria-sort')).toBe('ascending');

    await table.sortBy('Lot');
    expect(await firsts(table)).toEqual(['L-11', 'L-10', 'L-9']);
    expect(root.querySelector('th')?.getAttribute('aria-sort')).toBe('descending');
  });

  it('sorts by the value, not by how it is written, and keeps the unknown last', async () => {
    const { table } = await drawn();
    await table.sortBy('Weight, kg');
    expect(await firsts(table)).toEqual(['L-10', 'L-11', 'L-9']);

    await table.sortBy('Use by');
    expect(await firsts(table)).toEqual(['L-11', 'L-10', 'L-9']);
    await table.sortBy('Use by');
    expect(await firsts(table)).toEqual(['L-10', 'L-11', 'L-9']);
  });

  it('leads from a row’s first cell and carries the heads into the cards', async () => {
    const { root } = await drawn();

    expect(root.querySelector('td a')?.getAttribute('href')).toBe('/lots/L-10');
    expect(root.querySelectorAll('td')[2]?.dataset['label']).toBe('Weight, kg');
  });

  it('says that it is loading, or that there is nothing', async () => {
    const { fixture, host, root } = await drawn();
    host.rows.set([]);
    host.loading.set(true);
    await fixture.whenStable();
    expect(root.querySelector('[aria-busy=true]')).not.toBeNull();

    host.loading.set(false);
    await fixture.whenStable();
    expect(root.querySelector('[aria-busy=true]')).toBeNull();
    expect(root.textContent).toContain('Nothing here yet.');
  });

  it('lets the keyboard into the box of a wide table', async () => {
    const { fixture, host, root } = await drawn();
    expect(root.querySelector('[role=region]')).toBeNull();
    host.wide.set(true);
    await fixture.whenStable();

    expect(root.querySelector<HTMLElement>('[role=region]')?.tabIndex).toBe(0);
    expect(root.querySelector('[role=region]')?.getAttribute('aria-label')).toBe('Pull list');
  });
});
