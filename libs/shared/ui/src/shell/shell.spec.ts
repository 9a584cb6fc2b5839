import { ChangeDetectionStrategy, Component, LOCALE_ID } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { AdminShell } from './admin-shell';
import { CutOff } from './cut-off';
import { provideHeadingFocus } from './heading-focus';
import { MenuItem } from './menu-item';
import { providePageTitle } from './page-title';
import { StorefrontShell } from './storefront-shell';
import { timeLeft } from './time-left';
import { Disclosure } from './disclosure';

@Component({ template: '<h1>Orders</h1>', changeDetection: ChangeDetectionStrategy.OnPush })
class OrdersPage {}

@Component({ template: '<h1>Invoices</h1>', changeDetection: ChangeDetectionStrategy.OnPush })
class InvoicesPage {}

@Component({
  imports: [CutOff, Disclosure, MenuItem, StorefrontShell],
  template: `
    <sw-storefront-shell [links]="links">
      <sw-cut-off swCutOff day="2026-12-04" [minutesLeft]="132" />
      <sw-disclosure swAccount icon="person" label="Account"><button swMenuItem>Sign out</button></sw-disclosure>
    </sw-storefront-shell>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Host {
  readonly links = [
    { label: 'Orders', path: '/orders' },
    { label: 'Invoices', path: '/invoices' },
  ];
}

async function drawn() {
  TestBed.configureTestingModule({
    providers: [
      { provide: LOCALE_ID, useValue: 'en-GB' },
      provideRouter([
        { path: 'orders', component: OrdersPage, title: 'Orders' },
        { path: 'invoices', component: InvoicesPage },
      ]),
      provideHeadingFocus(),
      providePageTitle('Seamwright'),
    ],
  });
  const fixture = TestBed.createComponent(Host);
  const router = TestBed.inject(Router);
  document.body.append(fixture.nativeElement);
  const go = async (address: string): Promise<void> => {
    await router.navigateByUrl(address);
    await fixture.whenStable();
  };
  await go('/orders');
  return { fixture, go, root: fixture.nativeElement as HTMLElement };
}

describe('StorefrontShell', () => {
  it('says that a page is on its way until it is drawn', async () => {
    const { fixture, go, root } = await drawn();
    const page = root.querySelector('main');
    expect(page?.getAttribute('aria-busy')).toBeNull();
    const opening = go('/invoices');
    fixture.detectChanges();
    expect(page?.getAttribute('aria-busy')).toBe('true');
    await opening;
    expect(page?.getAttribute('aria-busy')).toBeNull();
  });

  it('shows every link in the bar and in the menu, and which page is open', async () => {
    const { root } = await drawn();
    const texts = (selector: string) => [...root.querySelectorAll(selector)].map((link) => link.textContent?.trim());

    expect(texts('header > nav a')).toEqual(['Orders', 'Invoices']);
    expect(texts('.menu nav a')).toEqual(['Orders', 'Invoices']);
    expect(texts('header > nav [aria-current=page]')).toEqual(['Orders']);
  });

  it('keeps the delivery day and the time left in the bar', async () => {
    const { root } = await drawn();

    expect(root.querySelector('header sw-cut-off')?.textContent).toMatch(/Fri 4 Dec.*2 h 12 min/s);
  });

  it('moves focus to the heading of the page that was gone to, not on the first visit', async () => {
    const { go, root } = await drawn();
    expect(document.activeElement).toBe(document.body);
    await go('/invoices');

    expect(document.activeElement).toBe(root.querySelector('h1'));
    expect(document.activeElement?.textContent).toBe('Invoices');
  });

  it('leaves focus alone when only the query changes', async () => {
    const { go, root } = await drawn();
    const link = root.querySelector<HTMLElement>('header > nav a');
    link?.focus();
    await go('/orders?state=open');

    expect(document.activeElement).toBe(link);
  });

  it('skips the bar without leaving the page', async () => {
    const { root } = await drawn();
    root.querySelector('main')!.scrollIntoView = () => undefined;
    root.querySelector<HTMLElement>('sw-skip-link a')?.click();

    expect(document.activeElement).toBe(root.querySelector('main'));
    expect(TestBed.inject(Router).url).toBe('/orders');
  });

  it('titles the window by page and application', async () => {
    const { go } = await drawn();
    expect(document.title).toBe('Orders · Seamwright');
    await go('/invoices');
    expect(document.title).toBe('Seamwright');
  });
});

describe('Disclosure', () => {
  async function account() {
    const { fixture, root } = await drawn();
    const button = root.querySelector<HTMLButtonElement>('sw-disclosure button[aria-expanded]')!;
    const press = async (act: () => void): Promise<string | null> => {
      act();
      await fixture.whenStable();
      return button.getAttribute('aria-expanded');
    };
    expect(await press(() => button.click())).toBe('true');
    return { button, press, panel: root.querySelector<HTMLElement>('sw-disclosure .panel')! };
  }

  it('closes by Escape and gives focus back to its button', async () => {
    const { button, panel, press } = await account();
    const item = panel.querySelector('button')!;
    item.focus();

    expect(await press(() => item.dispatchEvent(new KeyboardEvent('keydown', { key: 'Escape', bubbles: true })))).toBe(
      'false',
    );
    expect(document.activeElement).toBe(button);
  });

  it('closes by a press elsewhere and when something in it was chosen', async () => {
    const { button, panel, press } = await account();
    expect(await press(() => document.body.dispatchEvent(new Event('pointerdown', { bubbles: true })))).toBe('false');

    expect(await press(() => button.click())).toBe('true');
    expect(await press(() => panel.querySelector('button')!.click())).toBe('false');
  });
});

describe('AdminShell', () => {
  it.each([
    [4, 'desk'],
    [7, 'wide'],
    [11, 'never'],
  ])('puts %d links into the bar from "%s" on', async (count, from) => {
    TestBed.configureTestingModule({ providers: [provideRouter([])] });
    const shell = TestBed.createComponent(AdminShell);
    shell.componentRef.setInput(
      'links',
      Array.from({ length: count }, (_, index) => ({ label: `Link ${index}`, path: `/${index}` })),
    );
    await shell.whenStable();

    expect(shell.nativeElement.querySelector('header').dataset.linksFrom).toBe(from);
  });
});

describe('time left', () => {
  it.each([
    [38, '38 min'],
    [132, '2 h 12 min'],
    [2_879, '47 h 59 min'],
    [2_880, '2 days'],
  ])('%d minutes are "%s"', (minutes, words) => {
    expect(timeLeft(minutes)).toBe(words);
  });

  it('is said to be over once the cut-off has passed', async () => {
    TestBed.configureTestingModule({ providers: [{ provide: LOCALE_ID, useValue: 'en-GB' }] });
    const cutOff = TestBed.createComponent(CutOff);
    cutOff.componentRef.setInput('day', '2026-12-04');
    cutOff.componentRef.setInput('minutesLeft', 0);
    await cutOff.whenStable();

    expect(cutOff.nativeElement.textContent).toContain('is closed');
  });
});
