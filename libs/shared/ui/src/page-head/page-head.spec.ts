import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { PageHead } from './page-head';

@Component({
  imports: [PageHead],
  template: `
    <sw-page-head heading="Striploin steak" sub="Boneless" [crumbs]="crumbs">
      <span swBeside>version 4</span>
      <button swActs>Print</button>
    </sw-page-head>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Host {
  readonly crumbs = [{ label: 'Beef', path: '/cuts/beef' }, { label: 'Striploin' }];
}

describe('PageHead', () => {
  it('has one heading that can take focus, its way there, its chip and its acts', async () => {
    TestBed.configureTestingModule({ providers: [provideRouter([])] });
    const host = TestBed.createComponent(Host);
    await host.whenStable();
    const head: HTMLElement = host.nativeElement;

    expect(head.querySelectorAll('h1')).toHaveLength(1);
    expect(head.querySelector('h1')?.tabIndex).toBe(-1);
    expect(head.querySelector('.title')?.textContent).toMatch(/Striploin steak\s*version 4/);
    expect(head.querySelector('nav a')?.getAttribute('href')).toBe('/cuts/beef');
    expect(head.querySelectorAll('nav a')).toHaveLength(1);
    expect(head.querySelector('.acts button')?.textContent).toBe('Print');
  });
});
