import { TestBed } from '@angular/core/testing';
import { carcaseMap, regionsOf, SPECIES } from '@seamwright/catalogue/domain';
import { CarcaseChart, type ChartRegion } from './carcase-chart';
import { regionName } from './region-names';
import { regionTowards } from './region-walk';

const REGIONS: readonly ChartRegion[] = [
  { key: 'shoulder', value: '4 cuts', shade: 1 },
  { key: 'rack', value: '2 cuts', shade: 0.5 },
  { key: 'breast', value: '1 cut', shade: 0.2 },
];

describe('the carcase chart', () => {
  const drawn = async (selected: string | null = null) => {
    const fixture = TestBed.createComponent(CarcaseChart);
    fixture.componentRef.setInput('species', 'lamb');
    fixture.componentRef.setInput('regions', REGIONS);
    fixture.componentRef.setInput('selected', selected);
    const chosen: (string | null)[] = [];
    fixture.componentInstance.chosen.subscribe((key) => chosen.push(key));
    await fixture.whenStable();
    const host = fixture.nativeElement as HTMLElement;
    document.body.append(host);
    const buttons = () => [...host.querySelectorAll<SVGElement>('[role=button]')];
    const region = (key: string) => host.querySelector(`[data-region="${key}"]`) as SVGElement;
    const press = async (key: string, pressed: string) => {
      region(key).dispatchEvent(new KeyboardEvent('keydown', { key: pressed, bubbles: true }));
      await fixture.whenStable();
    };
    return { host, chosen, buttons, region, press };
  };

  afterEach(() => document.body.replaceChildren());

  it('draws the whole side, and makes buttons only of what it was given, named with their numbers', async () => {
    const { host, buttons } = await drawn();
    expect(host.querySelectorAll('path.region, path.empty')).toHaveLength(regionsOf('lamb').length);
    expect(buttons().map((button) => button.getAttribute('aria-label'))).toEqual([
      'Shoulder, 4 cuts',
      'Rack, 2 cuts',
      'Breast, 1 cut',
    ]);
    expect(host.querySelector('svg')?.getAttribute('aria-label')).toBe('Side of lamb by region');
  });

  it('tells what is chosen, and lets go of it when it is chosen again', async () => {
    const { chosen, region } = await drawn('rack');
    expect(region('rack').getAttribute('aria-pressed')).toBe('true');
    region('breast').dispatchEvent(new MouseEvent('click'));
    region('rack').dispatchEvent(new MouseEvent('click'));
    expect(chosen).toEqual(['breast', null]);
  });

  it('is one stop for Tab; arrows walk it, Enter and Space choose', async () => {
    const { buttons, chosen, press, region } = await drawn();
    const stops = () => buttons().filter((button) => button.getAttribute('tabindex') === '0');
    expect(stops()).toEqual([region('shoulder')]);
    region('shoulder').focus();
    await press('shoulder', 'ArrowRight');
    expect(document.activeElement).toBe(region('rack'));
    expect(stops()).toEqual([region('rack')]);
    await press('rack', 'ArrowDown');
    expect(document.activeElement).toBe(region('breast'));
    await press('breast', 'Enter');
    await press('breast', ' ');
    expect(chosen).toEqual(['breast', 'breast']);
  });

  it('leads nowhere past the last region, nor by another key', () => {
    const { regions } = carcaseMap('lamb');
    expect(regionTowards(regions, 'neck', 'ArrowLeft')).toBeNull();
    expect(regionTowards(regions, 'neck', 'a')).toBeNull();
    expect(regionTowards(regions, 'nowhere', 'ArrowRight')).toBeNull();
    expect(regionTowards(regions, 'rack', 'ArrowRight')).toBe('loin');
    expect(regionTowards(regions, 'loin', 'ArrowDown')).toBe('flank');
  });

  it('has a word for every region', () => {
    for (const key of SPECIES.flatMap(regionsOf)) expect(regionName(key)).not.toBe(key);
  });
});
