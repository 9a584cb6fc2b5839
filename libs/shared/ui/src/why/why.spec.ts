import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { TestBed } from '@angular/core/testing';
import { Why } from './why';
import { WhyHarness } from './why.harness';

const price = [
  { label: 'Primal cost', value: '£12.10/kg', note: 'this week' },
  { label: 'Your price', value: '£23.60/kg', total: true },
];

async function drawn() {
  const fixture = TestBed.createComponent(Why);
  fixture.componentRef.setInput('heading', 'Your price');
  fixture.componentRef.setInput('parts', price);
  const why = await TestbedHarnessEnvironment.harnessForFixture(fixture, WhyHarness);
  return { fixture, why };
}

describe('Why', () => {
  it('answers with the parts of the number and gives focus back when closed', async () => {
    const { fixture, why } = await drawn();
    expect(await why.parts()).toEqual([]);
    await why.ask();
    const parts = await why.parts();
    await why.close();

    expect(parts.map(({ value }) => value)).toEqual(['£12.10/kg', '£23.60/kg']);
    expect(parts[0]?.label).toContain('this week');
    expect(await why.parts()).toEqual([]);
    expect(document.activeElement).toBe(fixture.nativeElement.querySelector('button'));
  });

  it('says which number it explains and whether its panel is open', async () => {
    const { fixture, why } = await drawn();
    await why.ask();
    const button: HTMLButtonElement = fixture.nativeElement.querySelector('button');

    expect(button.textContent?.trim()).toBe('why? Your price');
    expect(button.getAttribute('aria-expanded')).toBe('true');
    expect(document.querySelector('[role=dialog] h2')?.textContent).toBe('Your price');
  });

  it('takes its panel away with it', async () => {
    const { fixture, why } = await drawn();
    await why.ask();
    fixture.destroy();

    expect(document.querySelector('sw-why-panel')).toBeNull();
  });
});
