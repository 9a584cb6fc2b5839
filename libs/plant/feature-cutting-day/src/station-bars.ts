import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { stationName, type CuttingListWire } from '@seamwright/plant/contracts';
import { minutesOf } from '@seamwright/plant/domain';
import { Card } from '@seamwright/shared/ui';

/** Minutes of work at each station as bars; the longest fills the width. */
@Component({
  selector: 'sw-station-bars',
  imports: [Card],
  template: `
    <sw-card heading="Stations" i18n-heading="@@cuttingDay.stations">
      <span swBeside class="sw-muted" i18n="@@cuttingDay.stationsUnit">minutes</span>
      <dl>
        @for (bar of bars(); track bar.station) {
          <dt>{{ bar.name }}</dt>
          <dd class="bar" aria-hidden="true"><span [style.inline-size.%]="bar.percent"></span></dd>
          <dd class="sw-num">{{ bar.minutes }}</dd>
        }
      </dl>
    </sw-card>
  `,
  styles: `
    dl {
      display: grid;
      grid-template-columns: max-content minmax(0, 1fr) max-content;
      gap: 10px 16px;
      align-items: center;
    }

    .bar {
      block-size: 14px;
      border-radius: 3px;
      background: var(--sw-wash);
    }

    .bar span {
      display: block;
      block-size: 100%;
      border-radius: inherit;
      background: var(--sw-slate);
    }

    @media print {
      .bar {
        border: 1px solid var(--sw-line);
      }
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StationBars {
  readonly stations = input.required<CuttingListWire['stations']>();

  protected readonly bars = computed(() => {
    const longest = Math.max(1, ...this.stations().map(({ seconds }) => seconds));
    return this.stations().map(({ station, seconds }) => ({
      station,
      name: stationName(station),
      minutes: minutesOf(seconds),
      percent: Math.round((100 * seconds) / longest),
    }));
  });
}
