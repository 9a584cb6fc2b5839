import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { specDrawing, type DrawnNumbers } from '@seamwright/catalogue/domain';
import { pathOf } from './path';

const MARGIN = 1;

/** A small picture of a piece without writing, for lists. The words beside it tell, so screen readers pass it over. */
@Component({
  selector: 'sw-spec-thumb',
  template: `
    <svg [attr.viewBox]="viewBox()" focusable="false">
      @for (shape of shapes(); track $index) {
        <path [attr.data-part]="shape.part" [attr.d]="shape.path" />
      }
    </svg>
  `,
  styleUrl: './spec-thumb.scss',
  host: { 'aria-hidden': 'true' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SpecThumb {
  readonly numbers = input.required<DrawnNumbers>();

  private readonly drawing = computed(() => specDrawing(this.numbers(), { widthMm: 60, heightMm: 26, textMm: 1 }));

  protected readonly shapes = computed(() =>
    this.drawing().shapes.map(({ part, points, closed }) => ({ part, path: pathOf(points, closed) })),
  );
  protected readonly viewBox = computed(() => {
    const points = this.drawing().shapes.flatMap((shape) => shape.points);
    const [xs, ys] = [points.map(({ x }) => x), points.map(({ y }) => y)];
    const [left, top] = [Math.min(...xs) - MARGIN, Math.min(...ys) - MARGIN];
    return `${left} ${top} ${Math.max(...xs) + MARGIN - left} ${Math.max(...ys) + MARGIN - top}`;
  });
}
