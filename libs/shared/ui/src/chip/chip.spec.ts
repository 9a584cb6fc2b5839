import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { Chip } from './chip';

@Component({
  imports: [Chip],
  template: `<sw-chip tone="eye" icon="warning">use by 6 Dec</sw-chip>`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Host {}

describe('Chip', () => {
  it('tells its state in words, with the tone and icon beside them', async () => {
    const host = TestBed.createComponent(Host);
    await host.whenStable();
    const chip = host.nativeElement.querySelector('sw-chip');

    expect(chip.textContent.trim()).toBe('use by 6 Dec');
    expect(chip.dataset.tone).toBe('eye');
    expect(chip.querySelector('sw-icon')).not.toBeNull();
  });
});
