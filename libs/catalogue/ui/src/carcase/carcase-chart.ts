import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  ElementRef,
  inject,
  input,
  output,
  signal,
} from '@angular/core';
import { carcaseMap, type Curve, type MapRegion, type Species, speciesName } from '@seamwright/catalogue/domain';
import { regionName } from './region-names';
import { regionTowards } from './region-walk';

/** What one region of the chart tells. */
export interface ChartRegion {
  /** A region of the species' side. */
  readonly key: string;
  /** Short words under its name: "6 cuts", "+2.1 kg". */
  readonly value: string;
  /** How strongly it is shaded, from 0 to 1. */
  readonly shade: number;
  /** What the shading means; `plain` when it only tells how much. */
  readonly tone?: 'plain' | 'spare' | 'short';
}

/** Room round the side, in units of the map, for the outline's width. */
const MARGIN = 8;
/** About what a letter of a name takes, in CSS pixels. */
const LETTER_PX = 7.2;
const ROOM_PX = 6;

/**
 * A side of a carcase with its regions. Those that are given tell a number and can be chosen, by pointer, touch or
 * keyboard (arrows walk from region to region); the rest are only drawn.
 */
@Component({
  selector: 'sw-carcase-chart',
  templateUrl: './carcase-chart.html',
  styleUrl: './carcase-chart.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CarcaseChart {
  readonly species = input.required<Species>();
  readonly regions = input.required<readonly ChartRegion[]>();
  readonly selected = input<string | null>(null);

  /** The region that was chosen; null when it was chosen already and is let go. */
  readonly chosen = output<string | null>();

  private readonly widthPx = signal(720);
  private readonly focused = signal<string | null>(null);

  private readonly map = computed(() => carcaseMap(this.species()));
  protected readonly viewBox = computed(() => {
    const { width, height } = this.map();
    return `${-MARGIN} ${-MARGIN} ${width + 2 * MARGIN} ${height + 2 * MARGIN}`;
  });
  protected readonly label = computed(
    () => $localize`:@@catalogue.chart.label:Side of ${speciesName(this.species()).toLowerCase()}:species: by region`,
  );
  protected readonly outline = computed(() => `${pathAlong(this.map().outline)}Z`);
  protected readonly seams = computed(() => this.map().seams.map(pathAlong));
  protected readonly parts = computed(() => {
    const told = new Map(this.regions().map((region) => [region.key, region]));
    return this.map().regions.map((region) => this.partOf(region, told.get(region.key)));
  });

  /** The one region that Tab stops at. */
  protected readonly stop = computed(() => {
    const keys = this.parts().flatMap(({ key, told }) => (told ? [key] : []));
    return [this.focused(), this.selected()].find((key) => key !== null && keys.includes(key)) ?? keys[0] ?? null;
  });

  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;

  constructor() {
    const destroyed = inject(DestroyRef);
    afterNextRender(() => {
      if (typeof ResizeObserver === 'undefined') return;
      const observer = new ResizeObserver(([entry]) => this.widthPx.set(entry?.contentRect.width || 720));
      observer.observe(this.host);
      destroyed.onDestroy(() => observer.disconnect());
    });
  }

  protected choose(key: string): void {
    this.focused.set(key);
    this.chosen.emit(key === this.selected() ? null : key);
  }

  protected onKey(event: KeyboardEvent, key: string): void {
    if (event.key === 'Enter' || event.key === ' ') {
      event.preventDefault();
      this.choose(key);
      return;
    }
    const open = new Set(this.regions().map((region) => region.key));
    const next = regionTowards(
      this.map().regions.filter((region) => open.has(region.key)),
      key,
      event.key,
    );
    if (next === null) return;
    event.preventDefault();
    this.focused.set(next);
    this.host.querySelector<SVGElement>(`[data-region="${next}"]`)?.focus();
  }

  protected onFocus(key: string): void {
    this.focused.set(key);
  }

  private partOf(region: MapRegion, told: ChartRegion | undefined) {
    const name = regionName(region.key);
    const { width, height } = this.map();
    return {
      key: region.key,
      path: `${pathAlong(region.curves)}Z`,
      told,
      name,
      spoken: told ? $localize`:@@catalogue.chart.region:${name}:name:, ${told.value}:value:` : name,
      tone: told?.tone ?? 'plain',
      shade: told ? 0.08 + 0.6 * Math.min(1, Math.max(0, told.shade)) : 0,
      inner: region.inner,
      fits: this.fits(region, name),
      left: ((region.label.x + MARGIN) / (width + 2 * MARGIN)) * 100,
      top: ((region.label.y + MARGIN) / (height + 2 * MARGIN)) * 100,
    };
  }

  /** Whether a region is wide enough on the screen for its name; one beside its region always has room. */
  private fits({ curves, beside, inner }: MapRegion, name: string): boolean {
    if (beside) return this.widthPx() >= 480;
    const xs = curves.map(([from]) => from.x);
    const px = ((Math.max(...xs) - Math.min(...xs)) / this.map().width) * this.widthPx();
    return px >= name.length * LETTER_PX + ROOM_PX && (!inner || this.widthPx() >= 480);
  }
}

const at = (value: number): string => value.toFixed(1);

/** An SVG path along curves that follow one another. */
function pathAlong(curves: readonly Curve[]): string {
  const [first] = curves;
  if (!first) return '';
  const steps = curves.map(
    ([, leaving, arriving, to]) =>
      `C${at(leaving.x)} ${at(leaving.y)} ${at(arriving.x)} ${at(arriving.y)} ${at(to.x)} ${at(to.y)}`,
  );
  return `M${at(first[0].x)} ${at(first[0].y)}${steps.join('')}`;
}
