import { ComponentFixture, TestBed } from '@angular/core/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { MatInputHarness } from '@angular/material/input/testing';
import type { PriceListLine } from '@seamwright/pricing/contracts';
import type { PriceChange } from '@seamwright/pricing/data-access';
import { PriceEditor } from './price-editor';

const line: PriceListLine = {
  id: 'line-1',
  rowVersion: 4,
  specificationId: 's1',
  code: 'BF-901',
  name: 'Steak',
  choiceKey: null,
  basis: 'kg',
  priceMinor: 120_000,
  validFrom: '2099-01-01',
  validUntil: null,
  quoteNumber: null,
  breaks: [{ fromQuantity: 12_500, priceMinor: 1_990 }],
};

describe('setting a price', () => {
  let fixture: ComponentFixture<PriceEditor>;
  const wanted: PriceChange[] = [];

  async function opened(of: Partial<PriceListLine> = {}) {
    wanted.length = 0;
    fixture = TestBed.createComponent(PriceEditor);
    fixture.componentRef.setInput('line', { ...line, ...of });
    fixture.componentInstance.wanted.subscribe((change) => wanted.push(change));
    await fixture.whenStable();
    return TestbedHarnessEnvironment.loader(fixture).getAllHarnesses(MatInputHarness);
  }
  const save = async () => {
    fixture.nativeElement.querySelector('button[type=submit]').click();
    await fixture.whenStable();
  };

  it('begins with the price and breaks in force and sends them back in pence and grams', async () => {
    const [price, from, quantity, broken] = await opened();
    expect(await price?.getValue()).toBe('1200.00');
    expect(await from?.getValue()).toBe('2099-01-01');
    expect(await quantity?.getValue()).toBe('12.500');
    expect(await broken?.getValue()).toBe('19.90');
    await price?.setValue('21.50');
    await save();
    expect(wanted).toEqual([
      { from: '2099-01-01', priceMinor: 2_150, breaks: [{ fromQuantity: 12_500, priceMinor: 1_990 }] },
    ]);
  });

  it('counts cases under a case price', async () => {
    const [, , quantity] = await opened({ basis: 'case', breaks: [{ fromQuantity: 3, priceMinor: 4_000 }] });
    expect(await quantity?.getValue()).toBe('3');
    await quantity?.setValue('2.5');
    await save();
    expect(wanted).toEqual([]);
    expect(fixture.nativeElement.querySelector('mat-error')?.textContent).toContain('above one');
  });

  it('shows what the server refused at its field', async () => {
    await opened();
    fixture.componentRef.setInput('problem', {
      type: '',
      title: '',
      status: 422,
      detail: 'Quantities must rise.',
      instance: '',
      code: 'price-breaks-not-rising',
      errors: [{ pointer: '/breaks/0/fromQuantity', message: 'Quantities must rise.' }],
    });
    await fixture.whenStable();
    expect(fixture.nativeElement.querySelector('mat-error')?.textContent).toContain('Quantities must rise.');
  });
});
