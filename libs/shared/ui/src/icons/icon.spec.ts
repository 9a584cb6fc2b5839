import { TestBed } from '@angular/core/testing';
import { Icon } from './icon';

describe('Icon', () => {
  it('draws the outline asked for and stays silent', async () => {
    const icon = TestBed.createComponent(Icon);
    icon.componentRef.setInput('name', 'clock');
    await icon.whenStable();
    const clock = icon.nativeElement.querySelector('path').getAttribute('d');
    icon.componentRef.setInput('name', 'close');
    await icon.whenStable();

    expect(clock).toMatch(/^[mM]/);
    expect(icon.nativeElement.querySelector('path').getAttribute('d')).not.toBe(clock);
    expect(icon.nativeElement.getAttribute('aria-hidden')).toBe('true');
  });
});
