import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { OrderCard } from './order-card';

const visa = { id: 'visa', brand: 'visa', last4: '4242', expires: '08/29' };
const master = { id: 'master', brand: 'mastercard', last4: '4444', expires: '01/30' };

async function shown(inputs: Record<string, unknown>) {
  TestBed.configureTestingModule({ providers: [provideRouter([])] });
  const fixture = TestBed.createComponent(OrderCard);
  const all = { mayTry: true, cards: [visa, master], back: '/orders/a', ...inputs };
  for (const [name, value] of Object.entries(all)) fixture.componentRef.setInput(name, value);
  await fixture.whenStable();
  const page: HTMLElement = fixture.nativeElement;
  const words = () => (page.textContent ?? '').replace(/\s+/g, ' ').trim();
  const button = () => page.querySelector<HTMLButtonElement>('button');
  return { fixture, page, words, button };
}

describe('the card of an order', () => {
  it('says nothing when nothing can be done about it', async () => {
    expect((await shown({ mayTry: false })).words()).toBe('');
  });

  it('says why the last one was declined, and asks which one to pay with', async () => {
    const { fixture, page, words, button } = await shown({ declineCode: 'insufficient_funds' });
    const chosen: string[] = [];
    fixture.componentInstance.chosen.subscribe((cardId) => chosen.push(cardId));
    expect(words()).toContain('Why: not enough money on the card.');
    expect(button()?.disabled).toBe(true);
    page.querySelectorAll<HTMLInputElement>('input[type=radio]')[1]?.click();
    await fixture.whenStable();
    button()?.click();
    expect(chosen).toEqual(['master']);
  });

  it('can’t be pressed twice while the bank is asked', async () => {
    const { fixture, page, words, button } = await shown({});
    page.querySelector<HTMLInputElement>('input[type=radio]')?.click();
    fixture.componentRef.setInput('busy', true);
    await fixture.whenStable();
    expect(button()?.disabled).toBe(true);
    expect(words()).toContain('Asking the bank…');
  });

  it('leads to where a card is added, and from there back', async () => {
    const { page, words, button } = await shown({ cards: [] });
    expect(words()).toContain('No card is kept for you yet.');
    expect(button()).toBeNull();
    expect(page.querySelector('a')?.getAttribute('href')).toBe('/cards?back=%2Forders%2Fa');
  });

  it('leads to the bank that asks its holder', async () => {
    const { page } = await shown({ mayTry: false, confirmAt: 'https://bank.example/confirm' });
    expect(page.querySelector('a')?.href).toBe('https://bank.example/confirm');
  });

  it('says why another one could not be asked', async () => {
    const { words } = await shown({ problem: { title: 'Not now', detail: 'The list is closed.' } });
    expect(words()).toContain('The list is closed.');
  });
});
