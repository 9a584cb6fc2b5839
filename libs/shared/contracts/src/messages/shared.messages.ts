import type { MessageTable } from './message-table';

/** Refusals that any endpoint may give, put into words. */
export const sharedMessages = {
  unreadable: () => $localize`The request could not be read: it is not valid JSON.`,
  'too-large': (p) => $localize`That is too large: at most ${p['limit']}:limit: can be taken.`,
  'wrong-media-type': () => $localize`This kind of content can't be taken here.`,
  'file-missing': () => $localize`Choose a file to send.`,
  'not-signed-in': () => $localize`Sign in to go on.`,
  'not-allowed': () => $localize`Your role does not allow this. Ask your administrator if you need it.`,
  'not-found': () => $localize`There is nothing here, or it is not yours to see.`,
  'no-such-address': () => $localize`There is no such address.`,
  stale: () =>
    $localize`Somebody changed this since you opened it. What you typed is kept: look at the newer state, then try again.`,
  'version-missing': () => $localize`Say which version you are changing (If-Match).`,
  invalid: () => $localize`Some of what was sent can't be taken. Look at the marked fields.`,
  'key-missing': () => $localize`Send an Idempotency-Key with this request.`,
  'key-reused': () => $localize`This key was used for another request. Start the deed again.`,
  'key-in-use': () => $localize`The same request is still being worked on. Wait a moment and look again.`,
  'too-many': () => $localize`Too many requests in a short time. Wait a minute, then try again.`,
  'in-use': () => $localize`Something else still refers to this, so it can't be changed that way.`,
  'already-there': () => $localize`There is one like this already.`,
  'too-big': () => $localize`That number is larger than the desk can handle.`,
  'move-not-allowed': (p) => $localize`That can't be done now: it is ${p['from']}:state:.`,
  unexpected: () => $localize`Something went wrong on our side. Nothing was half-stored; try again in a moment.`,
} satisfies MessageTable;
