/** The form under which an e-mail address is kept and compared: composed, without spaces around it, in lower case. */
export const normaliseEmail = (text: string): string => text.normalize('NFC').trim().toLowerCase();
