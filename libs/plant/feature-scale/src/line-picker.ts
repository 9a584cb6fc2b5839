import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type { PackingLineWire } from '@seamwright/plant/contracts';
import { Icon } from '@seamwright/shared/ui';
import { openOf } from './weighing';

/** The lines of an order with how far each is. */
@Component({
  selector: 'sw-line-picker',
  imports: [Icon],
  template: `
    <ul aria-label="Lines of the order" i18n-aria-label="@@scale.lines">
      @for (row of rows(); track row.line.id) {
        <li>
          <button
            type="button"
            [attr.aria-current]="row.line.id === chosen() ? 'true' : null"
            (click)="choose.emit(row.line.id)"
          >
            <span class="words">
              <b>{{ row.line.name }}</b>
              <span class="sw-muted sw-small">{{ row.line.summary }}</span>
            </span>
            <span class="count">
              @if (row.open === 0) {
                <sw-icon name="ok" [size]="24" />
              }
              <span i18n="@@scale.lineCount">{{ row.line.packedPieces }} of {{ row.line.pieces }}</span>
              @if (row.line.shortPieces > 0) {
                <span class="short sw-small" i18n="@@scale.lineShort">{{ row.line.shortPieces }} short</span>
              }
            </span>
          </button>
        </li>
      }
    </ul>
  `,
  styleUrl: './line-picker.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LinePicker {
  readonly lines = input.required<readonly PackingLineWire[]>();
  /** The id of the line that is being packed. */
  readonly chosen = input.required<string | null>();
  readonly choose = output<string>();

  protected readonly rows = computed(() => this.lines().map((line) => ({ line, open: openOf(line) })));
}
