/** What comes in of each primal in a week: pieces, grams a piece, days from kill to the door, and life from the kill. */
export interface Arrival {
  readonly node: string;
  readonly pieces: number;
  readonly pieceGrams: number;
  readonly hungDays: number;
  readonly lifeDays: number;
}

const arrival = (node: string, pieces: number, pieceGrams: number, hungDays: number, lifeDays: number): Arrival => ({
  node,
  pieces,
  pieceGrams,
  hungDays,
  lifeDays,
});

/** By the keys of the cut tree. */
export const WEEKLY: readonly Arrival[] = [
  arrival('lamb-leg', 34, 2900, 3, 24),
  arrival('lamb-loin', 14, 2100, 3, 24),
  arrival('lamb-rack', 20, 1150, 3, 24),
  arrival('lamb-shoulder', 44, 3100, 3, 24),
  arrival('beef-striploin', 4, 7400, 10, 42),
  arrival('beef-rib', 4, 8600, 10, 42),
  arrival('beef-tenderloin', 4, 2600, 7, 42),
  arrival('beef-rump', 6, 6300, 10, 42),
  arrival('beef-topside', 4, 8200, 7, 42),
  arrival('beef-chuck', 6, 14200, 7, 42),
  arrival('beef-brisket', 4, 5600, 7, 42),
  arrival('beef-flank', 8, 5200, 5, 35),
  arrival('pork-belly', 10, 5300, 2, 18),
  arrival('pork-loin', 6, 7800, 2, 18),
  arrival('pork-shoulder', 5, 6900, 2, 18),
  arrival('pork-leg', 4, 9400, 2, 18),
  arrival('pork-tenderloin', 24, 620, 2, 18),
];

/** Invented slaughterhouses; approval numbers of no real plant. */
export const SUPPLIERS = {
  lamb: { supplier: 'High Shieling Lamb', slaughterhouse: 'ZZ 0101' },
  beef: { supplier: 'Garrow Cattle Company', slaughterhouse: 'ZZ 0202' },
  pork: { supplier: 'Withy Lane Pigs', slaughterhouse: 'ZZ 0303' },
} as const;
