import type { MessageTable } from './message-table';

/** Refusals of identity, put into words. */
export const identityMessages = {
  'sign-in-refused': () => $localize`The e-mail address or the password is not right.`,
  'sign-in-wait': (p) =>
    $localize`Too many tries from here. Wait ${p['seconds']}:seconds: seconds, then try again, or ask for a new password.`,
  'sign-in-at-storefront': () => $localize`This is the desk for our staff. Please sign in at the storefront.`,
  'sign-in-at-desk': () => $localize`This is the storefront for customers. Please sign in at the desk.`,
  'session-ended': () => $localize`Your sign-in has ended. Sign in again to go on.`,
  'wrong-origin': () => $localize`This request came from another website, so it was not taken.`,
  'link-not-valid': () =>
    $localize`This link was used already, was replaced by a newer one, or is too old. Ask for a new one.`,
  'password-short': (p) => $localize`Use at least ${p['least']}:least: characters. A short sentence is easy to keep.`,
  'password-long': (p) => $localize`Use at most ${p['most']}:most: characters.`,
  'password-is-email': () =>
    $localize`Your e-mail address is the first thing others would try. Choose another password.`,
  'password-common': () => $localize`This is one of the passwords that are tried first everywhere. Choose another.`,
  'password-wrong': () => $localize`This is not your present password.`,
  'email-taken': () => $localize`Somebody is here under this e-mail address already.`,
  'already-joined': () => $localize`This person has a password already and needs no invitation.`,
  'roles-missing': () => $localize`Choose at least one role.`,
  'roles-need-customer': () => $localize`A buyer belongs to a customer: choose which one.`,
  'roles-of-staff': () => $localize`Somebody who buys for a customer can't hold a role of our staff.`,
  'sites-not-kept': () => $localize`Only a buyer can be kept to some sites; an account owner acts for all of them.`,
  'sites-missing': () => $localize`Choose at least one site, or all of them.`,
  'site-unknown': () => $localize`One of these sites does not belong to this customer.`,
  'customers-not-kept': () => $localize`Only somebody who is a rep and nothing else can be kept to some customers.`,
  'customer-unknown': () => $localize`One of these customers does not exist.`,
  'group-unknown': () => $localize`This group does not exist.`,
  'not-yourself': () => $localize`You can't take your own way in away. Ask another administrator.`,
} satisfies MessageTable;
