import { TestBed } from '@angular/core/testing';
import { FrameIcon } from './frame-icon';
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

it('is drawn in an application’s frame as on its pages', async () => {
  const drawn = [Icon, FrameIcon].map((kind) => {
    const icon = TestBed.createComponent<Icon | FrameIcon>(kind);
    icon.componentRef.setInput('name', 'basket');
    return icon;
  });
  await Promise.all(drawn.map((icon) => icon.whenStable()));

  const [page, frame] = drawn.map((icon) => icon.nativeElement as HTMLElement);
  expect(frame?.querySelector('path')?.getAttribute('d')).toMatch(/^M206/);
  expect(frame?.innerHTML).toBe(page?.innerHTML);
  expect(frame?.getAttribute('aria-hidden')).toBe('true');
});
