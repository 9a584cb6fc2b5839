import { TestBed } from '@angular/core/testing';
import { SeamLine } from './seam-line';

describe('SeamLine', () => {
  it('lists the stages in order and says in words which are passed, now and ahead', async () => {
    const seam = TestBed.createComponent(SeamLine);
    seam.componentRef.setInput('label', 'Stages of the day');
    seam.componentRef.setInput('stages', [
      { label: 'Open', state: 'passed' },
      { label: 'Closed to orders', state: 'now', note: '16:00' },
      { label: 'Planned', state: 'ahead' },
    ]);
    await seam.whenStable();
    const list: HTMLOListElement = seam.nativeElement.querySelector('ol');
    const words = [...list.children].map((stage) => [...stage.children].map((part) => part.textContent));

    expect(list.getAttribute('aria-label')).toBe('Stages of the day');
    expect(words).toEqual([
      ['Open', 'passed'],
      ['Closed to orders', '16:00'],
      ['Planned', 'still ahead'],
    ]);
    expect([...list.children].map((stage) => stage.getAttribute('aria-current'))).toEqual([null, 'step', null]);
  });
});
