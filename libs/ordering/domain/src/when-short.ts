/** What the buyer wants of a line that can't be sent in full. */
export const WHEN_SHORT = ['leave-off', 'send-what-there-is', 'ask-me'] as const;
export type WhenShort = (typeof WHEN_SHORT)[number];
