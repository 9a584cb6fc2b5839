import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { Empty } from './empty';
import { ErrorState } from './error';
import { Loading } from './loading';
import { Stale } from './stale';

@Component({
  imports: [Empty, ErrorState, Loading, Stale],
  template: `
    <sw-empty heading="No orders yet" text="They appear here."><button>Open the order pad</button></sw-empty>
    <sw-error
      [problem]="problem"
      kept="Your lines are kept."
      [retryable]="retryable()"
      (retry)="retries = retries + 1"
    />
    <sw-loading [count]="3" />
    <sw-stale text="3 orders changed." [offline]="offline()" (refresh)="refreshes = refreshes + 1" />
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Host {
  readonly problem = {
    title: 'The order was not placed',
    detail: 'The cut-off has passed.',
    errors: [{ pointer: '/lines/1', message: 'Line 2: at least one piece.' }],
  };
  readonly retryable = signal(true);
  readonly offline = signal(false);
  retries = 0;
  refreshes = 0;
}

async function drawn() {
  const fixture = TestBed.createComponent(Host);
  await fixture.whenStable();
  const root: HTMLElement = fixture.nativeElement;
  return {
    fixture,
    host: fixture.componentInstance,
    part: (selector: string) => root.querySelector<HTMLElement>(selector),
  };
}

describe('states of a page', () => {
  it('empty: says what would be here and offers the next act', async () => {
    const { part } = await drawn();

    expect(part('sw-empty')?.textContent).toMatch(/No orders yet\s*They appear here\.\s*Open the order pad/);
  });

  it('error: says what happened and what was kept, and tries again', async () => {
    const { host, part } = await drawn();
    part('sw-error button')?.click();

    expect(part('sw-error')?.getAttribute('role')).toBe('alert');
    for (const words of ['not placed', 'cut-off has passed', 'Line 2', 'Your lines are kept']) {
      expect(part('sw-error')?.textContent).toContain(words);
    }
    expect(host.retries).toBe(1);
  });

  it('error: has a heading in plain words for an HTTP status, and says nothing twice', async () => {
    const fixture = TestBed.createComponent(ErrorState);
    const said = 'The 30th is past. Choose a later day.';
    fixture.componentRef.setInput('problem', {
      title: 'Unprocessable Entity',
      status: 422,
      detail: said,
      errors: [{ pointer: '/day', message: said }],
    });
    await fixture.whenStable();
    const root: HTMLElement = fixture.nativeElement;

    expect(root.querySelector('.title')?.textContent).toBe('Something has to be put right');
    expect(root.textContent?.split(said)).toHaveLength(2);
  });

  it('error: offers no second try where it can not help', async () => {
    const { fixture, host, part } = await drawn();
    host.retryable.set(false);
    await fixture.whenStable();

    expect(part('sw-error button')).toBeNull();
  });

  it('loading: is busy and says so once', async () => {
    const { part } = await drawn();

    expect(part('sw-loading')?.getAttribute('aria-busy')).toBe('true');
    expect(part('sw-loading')?.textContent?.trim()).toBe('Loading');
    expect(part('sw-loading')?.querySelectorAll('.line')).toHaveLength(3);
  });

  it('stale: offers what is new, but not without a connection', async () => {
    const { fixture, host, part } = await drawn();
    part('sw-stale button')?.click();
    host.offline.set(true);
    await fixture.whenStable();

    expect(host.refreshes).toBe(1);
    expect(part('sw-stale button')).toBeNull();
  });
});
