import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { Card } from './card';

@Component({
  imports: [Card],
  template: `<sw-card heading="Pull list"
      ><span swBeside>42 pieces</span>
      <p>rows</p></sw-card
    ><sw-card>bare</sw-card>`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Host {}

describe('Card', () => {
  it('has a heading with what stands beside it, or none', async () => {
    const host = TestBed.createComponent(Host);
    await host.whenStable();
    const [titled, bare] = host.nativeElement.querySelectorAll('sw-card');

    expect(titled.querySelector('.head').textContent.trim()).toMatch(/^Pull list\s*42 pieces$/);
    expect(titled.querySelector(':scope > p').textContent).toBe('rows');
    expect(bare.querySelector('h2')).toBeNull();
  });
});
