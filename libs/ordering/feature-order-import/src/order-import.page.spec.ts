import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { of, Subject, throwError } from 'rxjs';
import type { OrderImportWire } from '@seamwright/ordering/contracts';
import { OrderImports } from '@seamwright/ordering/data-access';
import { ApiProblem } from '@seamwright/shared/data-access';
import { DataTableHarness } from '@seamwright/shared/ui/table';
import { OrderImportPage } from './order-import.page';

const aSheet = (stated: Partial<OrderImportWire> = {}): OrderImportWire => ({
  id: 'import-1',
  rowVersion: 1,
  fileName: 'orders.xlsx',
  uploadedAt: '2026-12-01T12:00:00.000Z',
  currency: 'GBP',
  rows: 2,
  orders: [
    {
      customer: 'The Heron Rooms',
      site: 'Kitchen',
      deliveryDay: '2026-12-03',
      estimateMinor: 7370,
      maxMinor: 7706,
      lines: [
        {
          row: 2,
          code: 'BF-901',
          name: 'Striploin steak',
          summary: '',
          pieces: 10,
          estimateGrams: 2800,
          estimateMinor: 6720,
        },
      ],
    },
  ],
  faults: [],
  sameFileTakenAt: null,
  taken: null,
  takenAt: null,
  placed: [],
  ...stated,
});
const read = (sheet: OrderImportWire) => of({ percent: 100, answer: sheet });
const fault = { row: 3, column: 'F', code: 'cell-formula', message: 'This cell holds a formula.' };

const taken: unknown[][] = [];
async function open(upload: () => ReturnType<OrderImports['upload']>) {
  taken.length = 0;
  TestBed.configureTestingModule({
    providers: [
      provideRouter([]),
      {
        provide: OrderImports,
        useValue: {
          upload,
          take: (...asked: unknown[]) => {
            taken.push(asked);
            const placed = [{ id: 'order-1', number: 1001, customer: 'The Heron Rooms', deliveryDay: '2026-12-03' }];
            return of(aSheet({ taken: 'good-rows', placed, faults: [fault] }));
          },
        },
      },
    ],
  });
  const fixture = TestBed.createComponent(OrderImportPage);
  await fixture.whenStable();
  const page = fixture.nativeElement as HTMLElement;
  const field = page.querySelector<HTMLInputElement>('input[type=file]');
  Object.defineProperty(field, 'files', { value: [new File(['x'], 'orders.xlsx')] });
  field?.dispatchEvent(new Event('change'));
  await fixture.whenStable();
  const button = (words: string) =>
    [...page.querySelectorAll('button')].find((each) => each.textContent?.includes(words));
  return { fixture, page, button, loader: TestbedHarnessEnvironment.loader(fixture) };
}

describe('orders from a workbook', () => {
  it('names each bad cell by row and column, and takes the good rows when that is chosen', async () => {
    const { fixture, page, button, loader } = await open(() => read(aSheet({ faults: [fault] })));
    const table = await loader.getHarness(DataTableHarness);
    expect(await table.rows()).toEqual([['3', 'F', 'This cell holds a formula.']]);
    expect(button('Place the orders')?.disabled).toBe(true);
    [...page.querySelectorAll('label')].find((each) => each.textContent?.includes('The good rows'))?.click();
    await fixture.whenStable();
    button('Place the orders')?.click();
    await fixture.whenStable();
    expect(taken).toEqual([['import-1', 'good-rows', expect.any(String)]]);
    expect(page.querySelector('.placed a')?.getAttribute('href')).toBe('/orders/order-1');
    expect(page.textContent).toContain('What was left out');
  });

  it('takes a sheet without faults whole', async () => {
    const { fixture, button } = await open(() => read(aSheet()));
    button('Place the orders')?.click();
    await fixture.whenStable();
    expect(taken[0]?.[1]).toBe('all-or-none');
  });

  it('tells how much is sent, then that it is being read', async () => {
    const steps = new Subject<{ percent: number; answer: OrderImportWire | null }>();
    const { fixture, page } = await open(() => steps);
    const bar = () => page.querySelector('progress');
    steps.next({ percent: 40, answer: null });
    await fixture.whenStable();
    expect(bar()?.value).toBe(40);
    expect(page.textContent).not.toContain('Reading the workbook');
    steps.next({ percent: 100, answer: null });
    await fixture.whenStable();
    expect(page.textContent).toContain('Reading the workbook');
    steps.next({ percent: 100, answer: aSheet() });
    await fixture.whenStable();
    expect(bar()).toBeNull();
    expect(page.textContent).toContain('Place these orders');
  });

  it('says at the file why it can’t be read', async () => {
    const refused = new ApiProblem({
      type: '',
      title: '',
      status: 422,
      detail: 'This is not a workbook that can be read.',
      instance: '',
      code: 'workbook-unreadable',
      errors: [],
    });
    const { page } = await open(() => throwError(() => refused));
    expect(page.querySelector('sw-file-drop')?.textContent).toContain('This is not a workbook that can be read.');
  });
});
