/**
 * What stands between a number and its unit. It never breaks at the end of a line, and in the house's type it is a fifth
 * of an em; the narrow spaces there are half as wide and pass for nothing.
 */
export const UNIT_SPACE = '\u00a0';
