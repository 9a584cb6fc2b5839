import { LOCALE_ID } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { DatePipe } from './date.pipe';
import { Kg } from './kg';
import { KgPipe } from './kg.pipe';
import { Money } from './money';
import { MoneyPipe } from './money.pipe';
import { PercentPipe } from './percent.pipe';

describe('numbers on screen', () => {
  beforeEach(() => TestBed.configureTestingModule({ providers: [{ provide: LOCALE_ID, useValue: 'en-GB' }] }));

  it('writes money, weight, rates and days as the house does', () => {
    TestBed.runInInjectionContext(() => {
      expect(new MoneyPipe().transform(123450, 'GBP')).toBe('£1,234.50');
      expect(new KgPipe().transform(12480)).toBe('12.480\u00a0kg');
      expect(new KgPipe().transform(12480, 'bare')).toBe('12.480');
      expect(new PercentPipe().transform(605000)).toContain('60.5');
      expect(new DatePipe().transform('2026-12-04', 'short')).toBe('Fri 4 Dec');
    });
  });

  it('writes nothing for what is not known, and a nought for nought', () => {
    TestBed.runInInjectionContext(() => {
      expect(new MoneyPipe().transform(null, 'GBP')).toBe('');
      expect(new KgPipe().transform(undefined)).toBe('');
      expect(new DatePipe().transform(null)).toBe('');
      expect(new PercentPipe().transform(null)).toBe('');
      expect(new MoneyPipe().transform(0, 'GBP')).toBe('£0.00');
    });
  });

  it('sets what a price is for and the unit of a weight apart', async () => {
    const money = TestBed.createComponent(Money);
    money.componentRef.setInput('minor', 1420);
    money.componentRef.setInput('currency', 'GBP');
    money.componentRef.setInput('per', 'kg');
    const kg = TestBed.createComponent(Kg);
    kg.componentRef.setInput('grams', 280);
    await Promise.all([money.whenStable(), kg.whenStable()]);

    expect(money.nativeElement.textContent).toBe('£14.20/kg');
    expect(money.nativeElement.querySelector('.sw-unit').textContent).toBe('/kg');
    expect(kg.nativeElement.textContent).toBe('0.280\u00a0kg');
    expect(kg.nativeElement.querySelector('.sw-unit').textContent).toBe('\u00a0kg');
  });
});
