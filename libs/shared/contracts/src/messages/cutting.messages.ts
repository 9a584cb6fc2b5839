import type { MessageTable } from './message-table';

/** Refusals of cutting schemes, cutting tests and yields, put into words. */
export const cuttingMessages = {
  'scheme-node-unknown': () => $localize`There is no such place in the cut tree.`,
  'scheme-without-outputs': () => $localize`Say what comes out: a scheme has at least one output.`,
  'scheme-key-form': (p) =>
    $localize`“${p['key']}:key:” can't be a key: use small letters, digits and hyphens, a letter or digit first.`,
  'scheme-output-twice': (p) => $localize`“${p['name']}:name:” stands there twice.`,
  'scheme-yield-size': () => $localize`This share must be above zero. Take the line out if nothing comes of it.`,
  'scheme-value-below-zero': () => $localize`Only a by-product can have a value below zero.`,
  'scheme-lean-missing': () => $localize`Say the visual lean of this trim, in per cent.`,
  'scheme-lean-range': () => $localize`Visual lean and its tolerance are between 0 and 100 %.`,
  'scheme-place-for-joints-only': () => $localize`Only a joint product has a place in the cut tree.`,
  'scheme-joint-without-place': () => $localize`Say where this joint product stands in the cut tree.`,
  'scheme-output-is-input': () => $localize`This is the piece that goes in: it can't come out of itself.`,
  'scheme-other-species': () => $localize`This place in the cut tree is of another species than the input.`,
  'scheme-yields-over': (p) =>
    $localize`The outputs add up to ${p['percent']}:percent: of the input: at most ${p['most']}:most: can come out.`,
  'scheme-only-recipes-add': () => $localize`Only a recipe adds ingredients.`,
  'scheme-recipe-adds-nothing': () => $localize`A recipe adds at least one ingredient.`,
  'scheme-ingredient-size': () => $localize`Say how much of this is added: more than nothing.`,
  'scheme-only-blends-mix': () => $localize`Only a blend has trims and a band of lean.`,
  'scheme-blend-parts': () => $localize`A blend is made of at least two trims.`,
  'scheme-blend-band': () => $localize`The band goes from the least lean to the most, between 0 and 100 %.`,
  'scheme-blend-shares': (p) =>
    $localize`The trims add up to ${p['percent']}:percent: of the blend; they must be exactly 100 %.`,
  'scheme-blend-outside': (p) =>
    $localize`This blend has ${p['lean']}:lean: visual lean by weight; its band is ${p['least']}:least: to ${p['most']}:most: %.`,
  'scheme-cycle': (p) => $localize`That closes a circle: ${p['code']}:code: leads back to a piece that it is cut from.`,
  'scheme-not-cutting': (p) =>
    $localize`${p['code']}:code: is a recipe or a blend: a carcase can't be broken down through it.`,
  'scheme-through-unknown': (p) => $localize`${p['code']}:code: is neither a scheme nor a specification in force.`,
  'scheme-through-twice': (p) =>
    $localize`${p['code']}:code: starts from a piece that another of the named ones starts from too. Name one of them.`,
  'scheme-draft-of-another': () => $localize`Somebody else is writing this version. Ask them to send it to review.`,
  'scheme-species-kept': () => $localize`A scheme stays with its species. Open another scheme for this piece.`,
  'test-input-weight': () => $localize`Say what went in: more than 0 kg.`,
  'test-pieces': () => $localize`Say how many pieces went in: at least one.`,
  'test-added-weight': () => $localize`What was added can't weigh less than nothing.`,
  'test-only-recipes-add': () => $localize`Nothing is added in cutting. Leave this at 0 kg.`,
  'test-in-the-future': () => $localize`This day has not come yet.`,
  'test-output-unknown': (p) => $localize`“${p['key']}:key:” is not an output of what was tested.`,
  'test-output-twice': (p) => $localize`“${p['name']}:name:” was weighed already.`,
  'test-output-weight': () => $localize`A weight can't be below zero.`,
  'test-output-missing': (p) => $localize`“${p['name']}:name:” is not weighed. Put 0 where nothing came out.`,
  'test-nothing-came-out': () => $localize`Nothing came out of this test. Weigh at least one output.`,
  'test-outputs-over-input': (p) => $localize`More came out than went in, by ${p['over']}:over: g. Check the weights.`,
  'test-reason-missing': () => $localize`Say why this test is set aside.`,
  'test-subject-unknown': (p) => $localize`There is no scheme or specification ${p['code']}:code:.`,
  'test-pieces-unreadable': (p) => $localize`“${p['text']}:text:” is not a number of pieces.`,
  'test-column-unknown': (p) =>
    $localize`“${p['name']}:name:” is not an output of ${p['code']}:code:. Leave this empty.`,
  'adopt-without-tests': () => $localize`No test counts for every output yet, so there is no yield to adopt.`,
  'adopt-unjudged': (p) =>
    $localize`${p['count']}:count: tests stand out and nobody has looked at them. Keep them or set them aside first.`,
  'adopt-version-open': (p) =>
    $localize`Version ${p['version']}:version: is still being written or reviewed. Finish it first.`,
  'adopt-nothing-came-out': (p) =>
    $localize`“${p['name']}:name:” weighed nothing in every test. Take it out of the scheme instead.`,
} satisfies MessageTable;
