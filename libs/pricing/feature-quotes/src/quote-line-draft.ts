import { FormControl, FormGroup, Validators, type AbstractControl, type ValidationErrors } from '@angular/forms';
import type { PublicSpecification } from '@seamwright/catalogue/contracts';
import { offeredNumbers } from '@seamwright/catalogue/data-access';
import { lineWeights, resolveOffer, type LineWeights, type OfferedNumbers } from '@seamwright/catalogue/domain';
import { HOUSE_CURRENCY, lineAmounts, type LineAmounts, type PriceBasis } from '@seamwright/pricing/domain';
import { sayRefusal } from '@seamwright/shared/contracts';
import { newId, parseMoney } from '@seamwright/shared/util';

/** The controls are named as the fields are sent, so that what the server says of one stands beside it. */
export type QuoteLineForm = FormGroup<{
  chosen: FormGroup<Record<string, FormControl<string>>>;
  basis: FormControl<PriceBasis>;
  /** As typed: "9.80". */
  priceMinor: FormControl<string>;
}>;

/** One line while it is written: the specification that it is for and what is typed. */
export interface QuoteLineDraft {
  readonly id: string;
  readonly specification: PublicSpecification;
  readonly offer: OfferedNumbers;
  readonly form: QuoteLineForm;
}

/** What a whole case will weigh, and cost at the typed price; null while that is not a price. */
export interface ExpectedCase {
  readonly weights: LineWeights;
  readonly amounts: LineAmounts | null;
}

const ONE_CASE = { unit: 'case', count: 1 } as const;

/** A price above zero, or what is wrong with it in words. */
function isPrice({ value }: AbstractControl<string>): ValidationErrors | null {
  const typed = value.trim();
  if (typed === '') return null;
  const price = parseMoney(typed, HOUSE_CURRENCY);
  if (!price.ok || price.value <= 0)
    return { message: $localize`:@@quotes.price.unreadable:Type a price above zero, such as 12.50.` };
  return null;
}

export function draftOf(specification: PublicSpecification): QuoteLineDraft {
  const chosen = Object.fromEntries(
    specification.choices.map(({ key, defaultValue }) => [key, new FormControl(defaultValue, { nonNullable: true })]),
  );
  return {
    id: newId(),
    specification,
    offer: offeredNumbers(specification),
    form: new FormGroup({
      chosen: new FormGroup(chosen),
      basis: new FormControl<PriceBasis>('case', { nonNullable: true }),
      priceMinor: new FormControl('', { nonNullable: true, validators: [Validators.required, isPrice] }),
    }),
  };
}

/** The typed price in minor units; null while it is none. */
export function priceOf({ form }: QuoteLineDraft): number | null {
  const price = parseMoney(form.controls.priceMinor.value, HOUSE_CURRENCY);
  return price.ok && price.value > 0 ? price.value : null;
}

/** What a case of the line comes to; the refusal in words where the choices don't go together. */
export function expectedCase(draft: QuoteLineDraft): ExpectedCase | string {
  const { chosen, basis } = draft.form.getRawValue();
  const resolved = resolveOffer(draft.offer, chosen);
  if (!resolved.ok) return sayRefusal(resolved.refusal);
  const weights = lineWeights(resolved.value, ONE_CASE);
  const price = priceOf(draft);
  const amounts = price === null ? null : lineAmounts(basis, price, weights);
  return { weights, amounts: amounts?.ok ? amounts.value : null };
}
