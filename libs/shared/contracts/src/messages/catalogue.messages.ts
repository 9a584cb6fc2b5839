import type { MessageTable } from './message-table';

/** Refusals of catalogue, put into words. */
export const catalogueMessages = {
  'choice-unknown': (p) => $localize`There is no choice called ${p['choice']}:choice: on this specification.`,
  'choice-value-unknown': (p) =>
    $localize`${p['value']}:value: is not one of the values of ${p['choice']}:choice: on this specification.`,
  'choice-pair-forbidden': (p) => $localize`That can't be chosen together: ${p['reason']}:reason:`,
  'specification-withdrawn': (p) =>
    $localize`${p['code']}:code: has been withdrawn and can't be ordered any more. Look in the catalogue for what is offered now.`,
  'own-version': () => $localize`You wrote this version, so another person must approve it.`,
  'version-weights-order': () =>
    $localize`The smallest piece must not weigh more than the nominal one, nor that more than the largest.`,
  'version-yields-over-one': (p) =>
    $localize`The cut and everything else it gives add up to ${p['percent']}:percent: of the primal: at most 100 % can come out.`,
  'version-fat-cover': () => $localize`The fat cover must be between 0 and 60 mm.`,
  'version-missing': () => $localize`Fill this in before it goes to review.`,
  'version-at-least': (p) => $localize`This must be at least ${p['least']}:least:.`,
  'version-at-most': (p) => $localize`This must be at most ${p['most']}:most:.`,
  'version-time-negative': () => $localize`Minutes can't be below zero.`,
  'version-ageing': () => $localize`The shortest ageing can't be longer than the longest, nor below zero days.`,
  'version-step-empty': () => $localize`Say what is done in this step, or take it out.`,
  'version-life': () => $localize`The life left at delivery can't be longer than the shelf life.`,
  'version-storage': () => $localize`The lowest storage temperature can't be above the highest.`,
  'version-gtin': () => $localize`This is not a GTIN: a digit is wrong or missing.`,
  'version-choice-form': (p) =>
    $localize`${p['value']}:value: can't stand in a choice's key or value: use small letters, digits and hyphens.`,
  'version-choice-twice': (p) => $localize`${p['value']}:value: stands there twice.`,
  'version-default-unknown': (p) => $localize`The usual value of ${p['choice']}:choice: is not among its values.`,
  'version-rule-unknown': (p) => $localize`A rule speaks of ${p['value']}:value:, which can't be chosen here.`,
  'version-defaults-impossible': (p) => $localize`The usual values can't stand together: ${p['reason']}:reason:`,
  'search-range': () => $localize`The range ends before it begins.`,
  'search-price-customer': () => $localize`Prices are a customer's own: only a buyer can search by them.`,
  'synonym-empty': () => $localize`Type a name with letters.`,
  'synonym-taken': () => $localize`This name stands there already for that region.`,
  'synonym-of-nothing': () => $localize`There is no such cut or specification to name.`,
  'unece-code-length': (p) =>
    $localize`A UNECE code has ${p['wanted']}:wanted: digits; this has ${p['length']}:length: characters.`,
  'unece-field-digits': (p) =>
    $localize`Field ${p['number']}:number: takes digits only, ${p['digits']}:digits: of them.`,
  'unece-field-unused': (p) => $localize`Field ${p['number']}:number: is not used: it must be 00.`,
  'unece-value-unlisted': (p) =>
    $localize`${p['value']}:value: is not in the list of field ${p['number']}:number:. An administrator can complete the list.`,
  'unece-field-unknown': (p) => $localize`${p['field']}:field: is not a field of the UNECE code that can be chosen.`,
  'unece-fat-differs': (p) =>
    $localize`The fat thickness is stated as ${p['fatCode']}:fatCode: elsewhere on this version: they must agree.`,
  'unece-item-missing': () => $localize`Without a UNECE item number there is no code.`,
  'unece-species-unlisted': () => $localize`The list of field 1 has no number for this species yet.`,
  'unece-value-taken': () => $localize`The list of this field has that value already.`,
  'unece-species-taken': () => $localize`Another value of field 1 stands for this species already.`,
  'specification-code-taken': (p) => $localize`There is a specification ${p['code']}:code: already.`,
  'draft-open': (p) => $localize`${p['author']}:author: is writing the next version already.`,
  'draft-of-another': (p) =>
    $localize`Only ${p['author']}:author: can change this draft. Leave a comment beside the field.`,
  'version-in-review': () => $localize`A version is in review. Approve it or send it back before the next is written.`,
} satisfies MessageTable;
