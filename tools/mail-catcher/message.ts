import type { AddressObject, ParsedMail } from 'mailparser';

/** A file that came with a mail. */
export interface MailAttachment {
  fileName: string;
  contentType: string;
  content: Buffer;
}

/** A mail as it was kept. */
export interface Message {
  id: string;
  receivedAt: Date;
  /** Who it was from, by its head. */
  from: string;
  /** Whom the sending server named, hidden copies included. */
  recipients: string[];
  to: string;
  subject: string;
  text: string;
  html: string | null;
  headers: Record<string, string>;
  attachments: MailAttachment[];
}

function addresses(head: AddressObject | AddressObject[] | undefined): string {
  if (head === undefined) return '';
  return (Array.isArray(head) ? head : [head]).map(({ text }) => text).join(', ');
}

/** The value of a head line, which begins with its name: `X-Kind: order` → `order`. */
function headValue(line: string): string {
  return line
    .slice(line.indexOf(':') + 1)
    .replaceAll(/\r?\n\s+/g, ' ')
    .trim();
}

/** A parsed mail in the catcher's words. */
export function toMessage(mail: ParsedMail, arrived: { id: string; at: Date; recipients: string[] }): Message {
  return {
    id: arrived.id,
    receivedAt: arrived.at,
    from: mail.from?.text ?? '',
    recipients: arrived.recipients,
    to: addresses(mail.to),
    subject: mail.subject ?? '',
    text: mail.text ?? '',
    html: mail.html || null,
    headers: Object.fromEntries(mail.headerLines.map(({ key, line }) => [key, headValue(line)])),
    attachments: mail.attachments.map(({ filename, contentType, content }, index) => ({
      fileName: filename ?? `attachment-${index + 1}`,
      contentType,
      content,
    })),
  };
}
