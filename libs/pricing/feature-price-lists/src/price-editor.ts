import { ChangeDetectionStrategy, Component, computed, effect, input, output, signal } from '@angular/core';
import {
  FormArray,
  FormControl,
  FormGroup,
  ReactiveFormsModule,
  Validators,
  type AbstractControl,
} from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatError, MatFormField, MatLabel, MatPrefix, MatSuffix } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import type { PriceListLine } from '@seamwright/pricing/contracts';
import type { PriceChange } from '@seamwright/pricing/data-access';
import { HOUSE_CURRENCY, type PriceBasis, type PriceBreak } from '@seamwright/pricing/domain';
import { basisWord } from '@seamwright/pricing/ui';
import type { Problem } from '@seamwright/shared/contracts';
import { FieldError, FormErrors, showServerErrors } from '@seamwright/shared/ui/forms';
import { grams, formatKg, minorUnits, parseKg, parseMoney, formatMoney } from '@seamwright/shared/util';

type BreakForm = FormGroup<{ fromQuantity: FormControl<string>; priceMinor: FormControl<string> }>;

/** Sets a price and its quantity breaks from a day on. The controls are named as the fields are sent. */
@Component({
  selector: 'sw-price-editor',
  imports: [
    FieldError,
    FormErrors,
    MatButton,
    MatError,
    MatFormField,
    MatInput,
    MatLabel,
    MatPrefix,
    MatSuffix,
    ReactiveFormsModule,
  ],
  templateUrl: './price-editor.html',
  styleUrl: './price-editor.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PriceEditor {
  readonly line = input.required<PriceListLine>();
  readonly running = input(false);
  readonly problem = input<Problem | null>(null);
  readonly wanted = output<PriceChange>();
  readonly left = output();

  protected readonly unit = computed(() => basisWord(this.line().basis));
  protected readonly homeless = signal<readonly { pointer: string; message: string }[]>([]);
  protected readonly form = new FormGroup({
    from: new FormControl('', { nonNullable: true, validators: Validators.required }),
    priceMinor: new FormControl('', { nonNullable: true, validators: [Validators.required, isPrice] }),
    breaks: new FormArray<BreakForm>([]),
  });

  constructor() {
    effect(() => this.fill(this.line()));
    effect(() => {
      const problem = this.problem();
      this.homeless.set(problem ? placed(this.form, problem) : []);
    });
  }

  protected addBreak(each: PriceBreak | null = null): void {
    const { basis } = this.line();
    this.form.controls.breaks.push(
      new FormGroup({
        fromQuantity: new FormControl(each ? quantityText(basis, each.fromQuantity) : '', {
          nonNullable: true,
          validators: [Validators.required, isQuantity(basis)],
        }),
        priceMinor: new FormControl(each ? priceText(each.priceMinor) : '', {
          nonNullable: true,
          validators: [Validators.required, isPrice],
        }),
      }),
    );
  }

  protected takeOff(at: number): void {
    this.form.controls.breaks.removeAt(at);
  }

  protected save(): void {
    this.form.markAllAsTouched();
    if (this.form.invalid) return;
    const { from, priceMinor, breaks } = this.form.getRawValue();
    const { basis } = this.line();
    const price = readPrice(priceMinor);
    if (price === null) return;
    this.wanted.emit({
      from,
      priceMinor: price,
      breaks: breaks.flatMap((each) => {
        const [fromQuantity, minor] = [readQuantity(basis, each.fromQuantity), readPrice(each.priceMinor)];
        return fromQuantity === null || minor === null ? [] : [{ fromQuantity, priceMinor: minor }];
      }),
    });
  }

  private fill(line: PriceListLine): void {
    this.form.controls.breaks.clear();
    this.form.reset({ from: laterDay(line.validFrom), priceMinor: priceText(line.priceMinor) });
    line.breaks.forEach((each) => this.addBreak(each));
  }
}

/** A price that begins in the future is set from its first day; one in force from the person's own today. */
function laterDay(validFrom: string): string {
  const today = new Intl.DateTimeFormat('sv-SE').format(new Date());
  return validFrom > today ? validFrom : today;
}

function placed(form: AbstractControl, problem: Problem): readonly { pointer: string; message: string }[] {
  const homeless = showServerErrors(form, problem.errors);
  return problem.errors.length > 0 ? homeless : [{ pointer: '', message: problem.detail }];
}

/** "9.80", without the currency's sign, which stands before the field. */
const priceText = (minor: number): string => formatMoney(minorUnits(minor), HOUSE_CURRENCY).replace(/[^\d.]/g, '');

function readPrice(text: string): number | null {
  const price = parseMoney(text, HOUSE_CURRENCY);
  return price.ok && price.value > 0 ? price.value : null;
}

const quantityText = (basis: PriceBasis, quantity: number): string =>
  basis === 'kg' ? formatKg(grams(quantity)) : String(quantity);

/** Grams under a price per kg, else a whole count; from 2 on, since 1 is the price itself. */
function readQuantity(basis: PriceBasis, text: string): number | null {
  if (basis === 'kg') {
    const weight = parseKg(text);
    return weight.ok && weight.value > 1 ? weight.value : null;
  }
  return /^\d{1,6}$/.test(text.trim()) && Number(text) > 1 ? Number(text) : null;
}

function isPrice({ value }: AbstractControl<string>) {
  return value === '' || readPrice(value) !== null
    ? null
    : { message: $localize`:@@priceList.price.unreadable:Type a price above zero, such as 12.50.` };
}

const isQuantity =
  (basis: PriceBasis) =>
  ({ value }: AbstractControl<string>) =>
    value === '' || readQuantity(basis, value) !== null
      ? null
      : { message: $localize`:@@priceList.quantity.unreadable:Type a quantity above one.` };
