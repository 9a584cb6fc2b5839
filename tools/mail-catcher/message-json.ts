import type { Message } from './message';

/** A mail in a list: all but its content. */
export interface MessageSummary {
  id: string;
  receivedAt: string;
  from: string;
  to: string;
  recipients: string[];
  subject: string;
  attachments: { fileName: string; contentType: string; sizeBytes: number }[];
}

/** A mail as JSON; attachments are fetched on their own, counted from 0. */
export interface MessageDetail extends MessageSummary {
  text: string;
  html: string | null;
  headers: Record<string, string>;
}

export function toSummary(message: Message): MessageSummary {
  const { id, receivedAt, from, to, recipients, subject, attachments } = message;
  return {
    id,
    receivedAt: receivedAt.toISOString(),
    from,
    to,
    recipients,
    subject,
    attachments: attachments.map(({ fileName, contentType, content }) => ({
      fileName,
      contentType,
      sizeBytes: content.length,
    })),
  };
}

export function toDetail(message: Message): MessageDetail {
  const { text, html, headers } = message;
  return { ...toSummary(message), text, html, headers };
}
