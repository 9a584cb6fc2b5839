/** The code as a GS1 element in the writing for people: application identifier 7002, UN/ECE meat cut code. */
export const gs1MeatCut = (uneceCode: string): string => `(7002)${uneceCode}`;
