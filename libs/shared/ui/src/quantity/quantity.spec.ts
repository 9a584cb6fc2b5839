import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { QuantityField } from './quantity';
import { QuantityHarness } from './quantity.harness';
import { readUnits, withPoint } from './smallest-units';

@Component({
  imports: [QuantityField, ReactiveFormsModule],
  template: `
    <sw-quantity
      label="Belly"
      unit="kg"
      [about]="true"
      [decimals]="1"
      [min]="5"
      [max]="130"
      [step]="5"
      [formControl]="kg"
    />
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Host {
  readonly kg = new FormControl<number | null>(120);
}

async function drawn() {
  const fixture = TestBed.createComponent(Host);
  const field = await TestbedHarnessEnvironment.loader(fixture).getHarness(QuantityHarness);
  return { field, kg: fixture.componentInstance.kg };
}

describe('QuantityField', () => {
  it('steps between its limits', async () => {
    const { field, kg } = await drawn();
    await field.more();
    expect(await field.text()).toBe('12.5');
    await field.more();
    await field.more();
    expect(kg.value).toBe(130);

    kg.setValue(7);
    await field.less();
    expect(kg.value).toBe(5);
  });

  it('takes what is typed as whole smallest units, point or comma', async () => {
    const { field, kg } = await drawn();
    await field.type('9,5');

    expect(kg.value).toBe(95);
    expect(await field.text()).toBe('9.5');
  });

  it.each(['', 'ten', '9.55', '0', '99', '-6'])('keeps "%s" to be mended and gives no value', async (text) => {
    const { field, kg } = await drawn();
    await field.type(text);

    expect(kg.value).toBeNull();
    expect(await field.isInvalid()).toBe(true);
    expect(await field.text()).toBe(text);
  });

  it('forgets what could not be used once it is stepped', async () => {
    const { field } = await drawn();
    await field.type('ten');
    await field.more();

    expect(await field.text()).toBe('1');
    expect(await field.isInvalid()).toBe(false);
  });
});

describe('whole smallest units', () => {
  it.each([
    [125, 1, '12.5'],
    [120, 1, '12'],
    [5, 3, '0.005'],
    [0, 2, '0'],
    [24, 0, '24'],
  ])('%d with %d decimals is %s, there and back', (units, decimals, text) => {
    expect(withPoint(units, decimals)).toBe(text);
    expect(readUnits(text, decimals)).toBe(units);
  });
});
