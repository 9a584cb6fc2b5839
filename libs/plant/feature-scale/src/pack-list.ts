import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type { PackingLineWire } from '@seamwright/plant/contracts';
import { Icon, KgPipe } from '@seamwright/shared/ui';

/** The packs of a line, the newest first, each of which can be taken back. */
@Component({
  selector: 'sw-pack-list',
  imports: [Icon, KgPipe],
  template: `
    <ol aria-label="Packs of this line" i18n-aria-label="@@scale.packs">
      @for (pack of packs(); track pack.id) {
        <li>
          <span>
            <b>{{ pack.netGrams | swKg }}</b>
            <span class="sw-muted sw-small detail" i18n="@@scale.packDetail">
              {pack.pieces, plural, =1 {1 piece} other {{{ pack.pieces }} pieces}} · lot {{ pack.lotCode }}
            </span>
            @if (pack.outOfLimits) {
              <span class="reason sw-small detail"><sw-icon name="warning" [size]="18" /> {{ pack.reason }}</span>
            }
          </span>
          @if (open()) {
            <button type="button" [disabled]="busy()" (click)="takeBack.emit(pack.id)" i18n="@@scale.takeBack">
              Take back
            </button>
          }
        </li>
      } @empty {
        <li class="sw-muted" i18n="@@scale.noPacks">Nothing packed of this line yet.</li>
      }
    </ol>
  `,
  styleUrl: './pack-list.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PackList {
  readonly line = input.required<PackingLineWire>();
  /** Whether packs can still be taken back. */
  readonly open = input.required<boolean>();
  readonly busy = input(false);
  /** The id of the pack. */
  readonly takeBack = output<string>();

  protected readonly packs = computed(() => [...this.line().packs].reverse());
}
