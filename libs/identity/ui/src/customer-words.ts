import { CUSTOMER_KINDS, TERMS_FROM, type CustomerKind, type TermsFrom } from '@seamwright/identity/domain';

const KINDS: Readonly<Record<CustomerKind, string>> = {
  restaurant: $localize`Restaurant`,
  hotel: $localize`Hotel`,
  pub: $localize`Pub`,
  caterer: $localize`Caterer`,
  butcher: $localize`Butcher`,
  'farm-shop': $localize`Farm shop`,
  school: $localize`School`,
  'care-home': $localize`Care home`,
};

const TERMS: Readonly<Record<TermsFrom, string>> = {
  invoice: $localize`from the invoice`,
  'end-of-week': $localize`from the end of its week`,
  'end-of-month': $localize`from the end of its month`,
};

export const customerKindName = (kind: CustomerKind): string => KINDS[kind];
export const termsFromName = (from: TermsFrom): string => TERMS[from];
export const customerKindNames = CUSTOMER_KINDS.map((value) => ({ value, label: KINDS[value] }));
export const termsFromNames = TERMS_FROM.map((value) => ({ value, label: TERMS[value] }));
