import { expect } from '@playwright/test';
import { addresses } from '../stack/addresses';

interface Summary {
  readonly id: string;
  readonly subject: string;
  readonly attachments: readonly { readonly fileName: string; readonly contentType: string }[];
}

export interface Mail extends Summary {
  readonly text: string;
}

const api = (path: string): string => new URL(`api/${path}`, addresses().mail).href;

async function json<T>(url: string): Promise<T> {
  const answer = await fetch(url);
  if (!answer.ok) throw new Error(`${url} answered ${answer.status}`);
  return (await answer.json()) as T;
}

/** The mail to an address whose subject says something, once it has arrived. */
export async function mailTo(address: string, subject: string | RegExp): Promise<Mail> {
  const matching = async (): Promise<Summary[]> => {
    const { messages } = await json<{ messages: Summary[] }>(api(`messages?to=${encodeURIComponent(address)}`));
    return messages.filter((message) =>
      typeof subject === 'string' ? message.subject === subject : subject.test(message.subject),
    );
  };
  await expect.poll(async () => (await matching()).length, { message: `a mail "${subject}" to ${address}` }).toBe(1);
  const [found] = await matching();
  return json<Mail>(api(`messages/${found?.id ?? ''}`));
}

/** The bytes of a mail's attachment, counted from 0. */
export async function attachmentOf(mail: Mail, position = 0): Promise<Uint8Array> {
  const answer = await fetch(api(`messages/${mail.id}/attachments/${position}`));
  if (!answer.ok) throw new Error(`The attachment answered ${answer.status}`);
  return new Uint8Array(await answer.arrayBuffer());
}
