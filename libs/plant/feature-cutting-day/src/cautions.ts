import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { cautionScope, cautionWords, type CuttingListWire } from '@seamwright/plant/contracts';
import { Icon } from '@seamwright/shared/ui';

/** The usual cautions for the work of the day. */
@Component({
  selector: 'sw-cautions',
  imports: [Icon],
  template: `
    @if (words().length > 0) {
      <section class="sw-note" aria-label="Cautions" i18n-aria-label="@@cuttingDay.cautions">
        <ul>
          @for (text of words(); track text) {
            <li><sw-icon name="warning" [size]="18" /> {{ text }}</li>
          }
        </ul>
        <p>{{ scope }}</p>
      </section>
    }
  `,
  styles: `
    ul {
      display: grid;
      gap: 8px;
      margin-block-end: 8px;
      padding: 0;
      color: var(--sw-ink);
      list-style: none;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Cautions {
  readonly cautions = input.required<CuttingListWire['cautions']>();
  protected readonly words = computed(() => this.cautions().map(cautionWords));
  protected readonly scope = cautionScope();
}
