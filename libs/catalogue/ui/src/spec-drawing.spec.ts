import { TestBed } from '@angular/core/testing';
import type { DrawnNumbers } from '@seamwright/catalogue/domain';
import { SpecDrawing } from './drawing/spec-drawing';
import { SpecThumb } from './drawing/spec-thumb';

const STEAK: DrawnNumbers = {
  kind: 'steak',
  lengthMm: 148,
  widthMm: 78,
  heightMm: 26,
  fatCoverMm: 6,
  ribs: null,
  boneState: 'boneless',
  finish: 'plain',
  nominalGrams: 280,
  minGrams: 266,
  maxGrams: 294,
};

describe('the drawing on a page', () => {
  const drawn = async (numbers: DrawnNumbers) => {
    const fixture = TestBed.createComponent(SpecDrawing);
    fixture.componentRef.setInput('numbers', numbers);
    await fixture.whenStable();
    return (fixture.nativeElement as HTMLElement).querySelector('svg') as SVGSVGElement;
  };
  const words = (svg: SVGSVGElement) => [...svg.querySelectorAll('text')].map((text) => text.textContent?.trim());

  it('is one picture to screen readers, told in words', async () => {
    const svg = await drawn(STEAK);
    expect(svg.getAttribute('role')).toBe('img');
    expect(svg.getAttribute('aria-label')).toBe(
      'Drawing to scale: 148 mm long, 78 mm wide, 26 mm thick; fat cover 6 mm at most; boneless; plain; weighs 280\u00a0g, from 266\u00a0g to 294\u00a0g.',
    );
  });

  it('writes measures, fat cover, scale and weights', async () => {
    const all = words(await drawn(STEAK));
    for (const word of [
      '148\u00a0mm',
      '78\u00a0mm',
      '26\u00a0mm',
      'fat cover 6 mm at most',
      '266\u00a0g',
      '280\u00a0g',
      '294\u00a0g',
    ]) {
      expect(all).toContain(word);
    }
    expect(all.some((word) => word?.includes('scale 1 :'))).toBe(true);
  });

  it('is drawn in true millimetres with writing of 13 CSS pixels', async () => {
    const svg = await drawn(STEAK);
    const width = Number(svg.getAttribute('viewBox')?.split(' ')[2]);
    expect(svg.style.inlineSize || svg.getAttribute('style')).toContain(`${width}`);
    expect(parseFloat(svg.style.fontSize) * (96 / 25.4)).toBeCloseTo(13, 3);
  });

  it('fits any usual sheet when it is printed, so that its scale stays true', async () => {
    const svg = await drawn(STEAK);
    const onScreen = svg.getAttribute('viewBox');
    window.dispatchEvent(new Event('beforeprint'));
    expect(svg.getAttribute('viewBox')).toMatch(/^0 0 170 /);
    window.dispatchEvent(new Event('afterprint'));
    expect(svg.getAttribute('viewBox')).toBe(onScreen);
  });

  it('has no fat to write of on a denuded piece', async () => {
    expect(words(await drawn({ ...STEAK, fatCoverMm: 0 })).join()).not.toContain('fat cover');
  });

  it('is passed over by screen readers where it only decorates a list', async () => {
    const fixture = TestBed.createComponent(SpecThumb);
    fixture.componentRef.setInput('numbers', STEAK);
    await fixture.whenStable();
    const host = fixture.nativeElement as HTMLElement;
    expect(host.getAttribute('aria-hidden')).toBe('true');
    expect(host.querySelectorAll('[data-part=lean]')).toHaveLength(1);
    expect(host.querySelectorAll('text')).toHaveLength(0);
  });
});
