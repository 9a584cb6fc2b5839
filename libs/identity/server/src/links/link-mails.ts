import type { DeskRole } from '@seamwright/identity/domain';
import { queueMail, type Tx } from '@seamwright/shared/server';
import { hashToken } from '../tokens/secret-token';
import { linkAddress, makeLinkToken } from './one-time-links';

export interface Addressee {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly roles: readonly DeskRole[];
  readonly customerId: string | null;
  readonly customerName: string | null;
}

/** Makes an invitation for somebody and queues the mail with its link. */
export async function mailInvitation(tx: Tx, now: Date, publicOrigin: string, person: Addressee): Promise<void> {
  const token = await makeLinkToken(tx, now, person.id, 'invitation');
  const link = linkAddress(publicOrigin, person.roles, 'invitation', token);
  const { name, email, customerId, customerName } = person;
  const greeting = $localize`Hello ${name}:name:,`;
  const what = customerName
    ? $localize`you have been invited to order at Seamwright for ${customerName}:customer:.`
    : $localize`you have been invited to the Seamwright desk.`;
  const how = $localize`Open this link within seven days and choose a password:`;
  const rest = $localize`The link works once. If you did not expect this mail, leave it be: without the link nothing happens.`;
  await queueMail(tx, now, {
    to: email,
    subject: $localize`Your invitation to Seamwright`,
    text: [greeting, what, how, link, rest].join('\n\n'),
    customerId,
    dedupeKey: `invitation:${hashToken(token)}`,
  });
}

/** Makes a link to set a new password and queues the mail with it. */
export async function mailPasswordReset(tx: Tx, now: Date, publicOrigin: string, person: Addressee): Promise<void> {
  const token = await makeLinkToken(tx, now, person.id, 'password-reset');
  const link = linkAddress(publicOrigin, person.roles, 'password-reset', token);
  const { name, email, customerId } = person;
  const greeting = $localize`Hello ${name}:name:,`;
  const how = $localize`somebody, probably you, asked for a new password at Seamwright. Open this link within an hour and choose one:`;
  const rest = $localize`The link works once. If it was not you, leave this mail be: your password stays as it is.`;
  await queueMail(tx, now, {
    to: email,
    subject: $localize`A new password for Seamwright`,
    text: [greeting, how, link, rest].join('\n\n'),
    customerId,
    dedupeKey: `password-reset:${hashToken(token)}`,
  });
}
