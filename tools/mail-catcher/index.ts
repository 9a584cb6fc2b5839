export { createMailCatcher, type ListeningMailCatcher, type MailCatcher } from './mail-catcher';
export type { MessageDetail, MessageSummary } from './message-json';
