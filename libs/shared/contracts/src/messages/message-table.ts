export type MessageParams = Readonly<Record<string, string | number>>;

/** A refusal's code → its words. A user can act on the text. */
export type MessageTable = Readonly<Record<string, (params: MessageParams) => string>>;
