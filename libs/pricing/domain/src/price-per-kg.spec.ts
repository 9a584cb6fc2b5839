import { pricePerKg } from './price-per-kg';

describe('a price put per kg', () => {
  const piece = { nominalGrams: 280, piecesPerCase: 12 };

  it('stands as it is when it is one', () => {
    expect(pricePerKg('kg', 2_400, piece)).toBe(2_400);
  });

  it('is what a kg of pieces or cases would come to, half up', () => {
    // 700 × 1000 / 280 and 8064 × 1000 / (280 × 12); 7 × 1000 / 280 ends on a half.
    expect(pricePerKg('piece', 700, piece)).toBe(2_500);
    expect(pricePerKg('case', 8_064, piece)).toBe(2_400);
    expect(pricePerKg('piece', 21, { nominalGrams: 2_000, piecesPerCase: 1 })).toBe(11);
  });
});
