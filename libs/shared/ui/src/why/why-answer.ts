/** One part of a number: what it is, its value as shown, and where it comes from. The total is set apart. */
export interface WhyPart {
  readonly label: string;
  readonly value: string;
  readonly note?: string;
  readonly total?: boolean;
}

/** All that a "why?" panel shows. */
export interface WhyAnswer {
  readonly heading: string;
  readonly parts: readonly WhyPart[];
  readonly note: string;
}
