import { ChangeDetectionStrategy, Component, computed, inject, input, LOCALE_ID, model } from '@angular/core';
import { Choice, type ChoiceOption } from '@seamwright/shared/ui/forms';
import { formatPlantDate, isPlantDate } from '@seamwright/shared/util';

/** A day that can be ordered for until its cut-off (an ISO instant); `closed` when the plant has closed its list. */
export interface OfferedDay {
  readonly day: string;
  readonly cutOffAt: string;
  readonly closed: boolean;
}

/** Chooses the delivery day among those offered, each with the time until which it can be ordered for. */
@Component({
  selector: 'sw-delivery-day-picker',
  imports: [Choice],
  template: `<sw-choice [label]="label" [options]="options()" [(value)]="day" />`,
  styles: `
    :host {
      --sw-choice-least: 148px;
    }

    @media (max-width: 599.98px) {
      :host {
        --sw-choice-least: 120px;
      }
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class DeliveryDayPicker {
  readonly days = input.required<readonly OfferedDay[]>();
  readonly timeZone = input.required<string>();
  readonly day = model<string | null>(null);

  private readonly locale = inject(LOCALE_ID);
  protected readonly label = $localize`:@@order.dayPicker.label:Delivery day`;
  protected readonly options = computed<ChoiceOption[]>(() => {
    const time = new Intl.DateTimeFormat(this.locale, {
      weekday: 'short',
      hour: '2-digit',
      minute: '2-digit',
      timeZone: this.timeZone(),
    });
    return this.days().map(({ day, cutOffAt, closed }) => ({
      value: day,
      label: isPlantDate(day) ? formatPlantDate(day, 'short', this.locale) : day,
      ...(closed
        ? { refused: $localize`:@@order.dayPicker.closed:list is closed` }
        : { note: $localize`:@@order.dayPicker.until:order by ${time.format(new Date(cutOffAt))}:time:` }),
    }));
  });
}
