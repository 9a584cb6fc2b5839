import { createTransport, type Transporter } from 'nodemailer';
import { newId } from '@seamwright/shared/util';
import { system } from '../database/caller';
import { inTransaction, type Tx } from '../database/in-transaction';
import { emit } from '../jobs/outbox';
import type { Subscriber } from '../jobs/subscriber';

export interface NewMail {
  readonly to: string;
  readonly subject: string;
  readonly text: string;
  readonly customerId: string | null;
  readonly documentId?: string;
  /** The fact that is told, so that it is told once: `order-confirmation:<id>:<whose>`. */
  readonly dedupeKey: string;
}

export const MAIL_QUEUED = 'mail-queued';

/** Writes a mail in the transaction of what it tells; it is sent after the commit, at least once. */
export async function queueMail(tx: Tx, now: Date, mail: NewMail): Promise<void> {
  const id = newId();
  const { to, subject, text, customerId, documentId, dedupeKey } = mail;
  const stored = await tx
    .insertInto('mails')
    .values({
      id,
      toAddress: to,
      subject,
      bodyText: text,
      customerId,
      documentId: documentId ?? null,
      dedupeKey,
      createdAt: now,
    })
    .onConflict((conflict) => conflict.column('dedupeKey').doNothing())
    .executeTakeFirst();
  if (stored.numInsertedOrUpdatedRows === 1n) await emit(tx, now, { type: MAIL_QUEUED, subjectId: id, customerId });
}

export interface Mailer {
  send(mail: {
    id: string;
    to: string;
    subject: string;
    text: string;
    attachment: { fileName: string; mediaType: string; bytes: Buffer } | null;
  }): Promise<void>;
  /** Lets its connections go. */
  close(): void;
}

/** Sends by SMTP. The mail's id becomes its Message-ID, so that a repeat can be told. */
export function smtpMailer(url: string, from: string): Mailer {
  // One connection for many mails.
  const transport: Transporter = createTransport({ url, pool: true, maxConnections: 2 });
  return {
    close: () => transport.close(),
    async send({ id, to, subject, text, attachment }) {
      await transport.sendMail({
        from,
        to,
        subject,
        text,
        messageId: `<${id}@seamwright>`,
        attachments: attachment
          ? [{ filename: attachment.fileName, contentType: attachment.mediaType, content: attachment.bytes }]
          : [],
      });
    },
  };
}

/** Sends what was queued. */
export function mailSubscriber(mailer: Mailer): Subscriber {
  return {
    name: 'mail',
    events: [MAIL_QUEUED],
    async handle({ database, clock }, event) {
      const mail = await inTransaction(database, system('job'), (tx) =>
        tx
          .selectFrom('mails as m')
          .leftJoin('documents as d', 'd.id', 'm.documentId')
          .select([
            'm.id',
            'm.toAddress',
            'm.subject',
            'm.bodyText',
            'm.sentAt',
            'd.fileName',
            'd.mediaType',
            'd.bytes',
          ])
          .where('m.id', '=', event.subjectId)
          .executeTakeFirst(),
      );
      if (!mail || mail.sentAt) return;
      const { fileName, mediaType, bytes } = mail;
      await mailer.send({
        id: mail.id,
        to: mail.toAddress,
        subject: mail.subject,
        text: mail.bodyText,
        attachment: fileName && mediaType && bytes ? { fileName, mediaType, bytes } : null,
      });
      const sentAt = await clock.now();
      await inTransaction(database, system('job'), (tx) =>
        tx.updateTable('mails').set({ sentAt, bodyText: '' }).where('id', '=', mail.id).execute(),
      );
    },
  };
}
