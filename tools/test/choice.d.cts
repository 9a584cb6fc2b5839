export const kinds: string[];
export const usage: string;
export function readChoice(words: string[]): { kinds: string[]; keep: boolean; help: boolean };
