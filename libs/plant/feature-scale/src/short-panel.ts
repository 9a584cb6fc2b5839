import { ChangeDetectionStrategy, Component, computed, input, linkedSignal, output, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { PackingLineWire } from '@seamwright/plant/contracts';
import { PieceStepper } from './piece-stepper';
import { shortReasons } from './reasons';
import { TouchChoice } from './touch-choice';
import { openOf } from './weighing';

/** Says how many pieces of a line can't be sent, and why. */
@Component({
  selector: 'sw-short-panel',
  imports: [MatButton, PieceStepper, TouchChoice],
  template: `
    <h2 i18n="@@scale.short.heading">What can't be sent</h2>
    <sw-piece-stepper
      label="Pieces short, in all"
      i18n-label="@@scale.short.pieces"
      [least]="0"
      [most]="most()"
      [(value)]="pieces"
    />
    @if (pieces() > 0) {
      <sw-touch-choice label="Why" i18n-label="@@scale.short.why" [options]="reasons" [(value)]="reason" />
    }
    <div class="sw-acts">
      <button
        matButton="filled"
        type="button"
        [disabled]="busy() || (pieces() > 0 && reason() === null)"
        (click)="mark.emit({ pieces: pieces(), reason: pieces() > 0 ? (reason() ?? '') : '' })"
        i18n="@@scale.short.mark"
      >
        Mark short
      </button>
      <button matButton="outlined" type="button" (click)="back.emit()" i18n="@@scale.short.back">Go on packing</button>
    </div>
  `,
  styles: `
    :host {
      display: grid;
      gap: 16px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ShortPanel {
  readonly line = input.required<PackingLineWire>();
  readonly busy = input(false);
  readonly mark = output<{ pieces: number; reason: string }>();
  readonly back = output();

  protected readonly most = computed(() => this.line().pieces - this.line().packedPieces);
  /** What is open is what is most likely missing. */
  protected readonly pieces = linkedSignal(() => this.line().shortPieces + openOf(this.line()));
  protected readonly reason = signal<string | null>(null);
  protected readonly reasons = shortReasons().map((text) => ({ value: text, label: text }));
}
