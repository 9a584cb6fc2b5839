import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** A knot on the seam: a stage's name, a short note (a time, a person) and whether it is behind us. */
export interface SeamStage {
  readonly label: string;
  readonly note?: string;
  readonly state: 'passed' | 'now' | 'ahead';
}

/**
 * The stages of an order, a quote, a lot or a day as knots on a seam that turns from stitched to solid as they are
 * passed. Lies across where there is room and runs down where there is not.
 */
@Component({
  selector: 'sw-seam-line',
  templateUrl: './seam-line.html',
  styleUrl: './seam-line.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SeamLine {
  readonly stages = input.required<readonly SeamStage[]>();
  /** What moves along the seam, for screen readers: "Stages of the order". */
  readonly label = input.required<string>();
}
