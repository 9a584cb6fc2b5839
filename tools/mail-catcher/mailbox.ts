import type { Message } from './message';

/** How many mails are kept; the oldest go first. */
export const CAPACITY = 500;

/** Caught mails in memory. */
export class Mailbox {
  #messages: Message[] = [];

  add(message: Message): void {
    this.#messages.push(message);
    if (this.#messages.length > CAPACITY) this.#messages.shift();
  }

  /** Newest first; with `to`, only what was sent to that address, whatever its letters' case. */
  list(to?: string): Message[] {
    const wanted = to?.trim().toLowerCase();
    return this.#messages
      .filter(({ recipients }) => !wanted || recipients.some((recipient) => recipient.toLowerCase() === wanted))
      .reverse();
  }

  find(id: string): Message | undefined {
    return this.#messages.find((message) => message.id === id);
  }

  clear(): void {
    this.#messages = [];
  }
}
