import {
  ChangeDetectionStrategy,
  Component,
  effect,
  inject,
  input,
  LOCALE_ID,
  output,
  signal,
  untracked,
} from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatCheckbox } from '@angular/material/checkbox';
import { MatError, MatFormField, MatHint, MatLabel, MatPrefix } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import type { DeliveryZoneWire } from '@seamwright/ordering/contracts';
import type { ZoneFields } from '@seamwright/ordering/data-access';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { FieldError, FormErrors, showServerErrors } from '@seamwright/shared/ui/forms';
import type { FieldProblem } from '@seamwright/shared/ui';
import { formatMoney, minorUnits, parseMoney } from '@seamwright/shared/util';
import { weekdayNames } from './weekdays';

const WEEK = [1, 2, 3, 4, 5, 6, 7] as const;

/** A delivery zone's name, weekdays, cut-off, lead days and charge. */
@Component({
  selector: 'sw-zone-form',
  imports: [
    FieldError,
    FormErrors,
    MatButton,
    MatCheckbox,
    MatError,
    MatFormField,
    MatHint,
    MatInput,
    MatLabel,
    MatPrefix,
    ReactiveFormsModule,
  ],
  templateUrl: './zone-form.html',
  styleUrl: './zone-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ZoneForm {
  /** What is changed; null for a new zone. */
  readonly zone = input<DeliveryZoneWire | null>(null);
  readonly running = input(false);
  /** What the server said against the last try. */
  readonly problems = input<readonly FieldProblem[]>([]);
  readonly saved = output<ZoneFields>();
  readonly left = output();

  private readonly locale = inject(LOCALE_ID);
  protected readonly weekdays = weekdayNames(this.locale);
  protected readonly homeless = signal<readonly FieldProblem[]>([]);
  protected readonly form = new FormGroup({
    name: new FormControl('', { nonNullable: true, validators: [Validators.required, Validators.maxLength(60)] }),
    weekdays: new FormGroup(
      Object.fromEntries(WEEK.map((day) => [day, new FormControl(day < 6, { nonNullable: true })])),
      {
        validators: ({ value }) =>
          Object.values(value as Record<string, boolean>).some(Boolean)
            ? null
            : { message: $localize`:@@zone.noDay:Choose one day at least.` },
      },
    ),
    cutOffTime: new FormControl('14:00', { nonNullable: true, validators: Validators.required }),
    leadDays: new FormControl(1, {
      nonNullable: true,
      validators: [Validators.required, Validators.min(1), Validators.max(14)],
    }),
    /** As typed: "6.50". */
    deliveryChargeMinor: new FormControl('0.00', {
      nonNullable: true,
      validators: ({ value }) => {
        const charge = parseMoney(String(value), HOUSE_CURRENCY);
        return charge.ok && charge.value >= 0
          ? null
          : { message: $localize`:@@zone.noMoney:Type an amount, such as 6.50.` };
      },
    }),
  });

  constructor() {
    effect(() => {
      const zone = this.zone();
      untracked(() => this.fill(zone));
    });
    effect(() => this.homeless.set(showServerErrors(this.form, this.problems())));
  }

  protected save(): void {
    this.form.markAllAsTouched();
    const { name, weekdays, cutOffTime, leadDays, deliveryChargeMinor } = this.form.getRawValue();
    const charge = parseMoney(deliveryChargeMinor, HOUSE_CURRENCY);
    if (this.form.invalid || !charge.ok) return;
    this.saved.emit({
      name,
      weekdays: WEEK.filter((day) => weekdays[day]),
      cutOffTime,
      leadDays,
      deliveryChargeMinor: charge.value,
    });
  }

  private fill(zone: DeliveryZoneWire | null): void {
    if (zone === null) return;
    const { name, weekdays, cutOffTime, leadDays, deliveryChargeMinor } = zone;
    this.form.setValue({
      name,
      weekdays: Object.fromEntries(WEEK.map((day) => [day, weekdays.includes(day)])),
      cutOffTime,
      leadDays,
      deliveryChargeMinor: formatMoney(minorUnits(deliveryChargeMinor), HOUSE_CURRENCY, this.locale).replace('£', ''),
    });
  }
}
