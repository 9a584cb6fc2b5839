import {
  afterNextRender,
  ChangeDetectionStrategy,
  ChangeDetectorRef,
  Component,
  computed,
  DestroyRef,
  ElementRef,
  inject,
  input,
  signal,
} from '@angular/core';
import { specDrawing, type DrawnNumbers, type Measure } from '@seamwright/catalogue/domain';
import { UNIT_SPACE } from '@seamwright/shared/util';
import { weightText } from '../weight-words';
import { drawingText, scaleText, viewName } from './drawing-words';
import { pathOf } from './path';

/** CSS pixels in a millimetre: an inch is 96 px. */
const PX_PER_MM = 96 / 25.4;
const TEXT_PX = 13;
/** Narrower than this nothing could be read; wider, a piece would not fill it. */
const NARROWEST_MM = 80;
const WIDEST_MM = 230;
/** Taller than this, what is to be chosen and bought would lie far below the picture. */
const TALLEST_MM = 68;
/** What every usual sheet has between its margins: wider, it would be shrunk and its scale be false. */
const PAPER_MM = 170;

/**
 * The to-scale drawing of a piece from its numbers. It is drawn in true millimetres for the width there is, so that
 * writing keeps its size on a phone and the stated scale holds on paper.
 */
@Component({
  selector: 'sw-spec-drawing',
  templateUrl: './spec-drawing.html',
  styleUrl: './spec-drawing.scss',
  host: { '(window:beforeprint)': 'redraw(true)', '(window:afterprint)': 'redraw(false)' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SpecDrawing {
  readonly numbers = input.required<DrawnNumbers>();

  private readonly widthPx = signal(720);
  private readonly printing = signal(false);
  private readonly changes = inject(ChangeDetectorRef);

  protected readonly drawing = computed(() => {
    const widthMm = this.printing()
      ? PAPER_MM
      : Math.min(WIDEST_MM, Math.max(NARROWEST_MM, this.widthPx() / PX_PER_MM));
    return specDrawing(this.numbers(), {
      widthMm,
      heightMm: Math.min(widthMm * 0.55, TALLEST_MM),
      textMm: TEXT_PX / PX_PER_MM,
    });
  });
  protected readonly viewBox = computed(() => `0 0 ${this.drawing().widthMm} ${this.drawing().heightMm}`);
  protected readonly shapes = computed(() =>
    this.drawing().shapes.map(({ part, points, closed }) => ({ part, path: pathOf(points, closed) })),
  );
  protected readonly measures = computed(() => this.drawing().measures.map(drawnMeasure));
  protected readonly ruler = computed(() => drawnMeasure(this.drawing().ruler));
  protected readonly captions = computed(() =>
    this.drawing().captions.map(({ view, at }) => ({ words: viewName(view), at })),
  );
  protected readonly scale = computed(() => scaleText(this.drawing().scale));
  protected readonly text = computed(() => drawingText(this.numbers()));
  protected readonly marks = computed(() => {
    const { min, nominal, max } = this.drawing().weights;
    const labelled = min.grams === max.grams ? [nominal] : [min, nominal, max];
    return labelled.map(({ grams, x }) => ({ x, words: weightText(grams), main: grams === nominal.grams }));
  });

  constructor() {
    const host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
    const destroyed = inject(DestroyRef);
    afterNextRender(() => {
      if (typeof ResizeObserver === 'undefined') return;
      const observer = new ResizeObserver(([entry]) => this.widthPx.set(entry?.contentRect.width || 720));
      observer.observe(host);
      destroyed.onDestroy(() => observer.disconnect());
    });
  }

  /** Draws it for paper, or for the screen again: at once, for the browser takes the page as it then stands. */
  protected redraw(printing: boolean): void {
    this.printing.set(printing);
    this.changes.detectChanges();
  }
}

/** A measured line with short strokes across both ends. */
function drawnMeasure({ mm, from, to, text, anchor }: Measure) {
  const upright = from.x === to.x;
  const [dx, dy] = upright ? [1.2, 0] : [0, 1.2];
  const across = [from, to].map(({ x, y }) =>
    pathOf(
      [
        { x: x - dx, y: y - dy },
        { x: x + dx, y: y + dy },
      ],
      false,
    ),
  );
  return { path: `${pathOf([from, to], false)}${across.join('')}`, words: `${mm}${UNIT_SPACE}mm`, text, anchor };
}
