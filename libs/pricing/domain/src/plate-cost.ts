import {
  divideFractions,
  fraction,
  fractionOfPpm,
  grams,
  minorUnits,
  multiplyFractions,
  refuse,
  ok,
  roundFraction,
  subtractFractions,
  toSafeNumber,
  type Fraction,
  type Grams,
  type MinorUnits,
  type Ppm,
  type Result,
  type Rounding,
} from '@seamwright/shared/util';

export interface Plate {
  /** One portion as it is bought. */
  readonly portionGrams: Grams;
  readonly priceMinorPerKg: MinorUnits;
  /** Lost in cooking, over 1,000,000 of the weight bought. */
  readonly cookingLossPpm: Ppm;
  /** Trimmed off or left in the pan after cooking, over 1,000,000 of the cooked weight. */
  readonly wastePpm: Ppm;
  /** The share of the menu price, before tax, that the meat may cost. */
  readonly foodCostPpm: Ppm;
}

export interface PlateCost {
  /** What the portion costs as bought. */
  readonly portionMinor: MinorUnits;
  /** What of it reaches the plate. */
  readonly servedGrams: Grams;
  /** What a kilogram on the plate costs. */
  readonly servedMinorPerKg: MinorUnits;
  /** Menu price before tax at which the meat costs its share. */
  readonly menuMinor: MinorUnits;
}

const ONE = fraction(1n);

/**
 * What a plate costs the kitchen; amounts and grams are rounded half up, each once. Refuses `plate-nothing-left` when
 * loss and waste leave nothing, `plate-food-cost` when the share is zero; pointing at the field.
 */
export function plateCost(plate: Plate): Result<PlateCost> {
  const left = servedShare(plate);
  if (left.n <= 0n) return refuse('plate-nothing-left', {}, '/wastePpm');
  if (plate.foodCostPpm <= 0) return refuse('plate-food-cost', {}, '/foodCostPpm');
  const cost = fraction(BigInt(plate.portionGrams) * BigInt(plate.priceMinorPerKg), 1000n);
  return ok({
    portionMinor: minorUnits(whole(cost)),
    servedGrams: grams(whole(multiplyFractions(fraction(BigInt(plate.portionGrams)), left))),
    servedMinorPerKg: minorUnits(whole(divideFractions(fraction(BigInt(plate.priceMinorPerKg)), left))),
    menuMinor: minorUnits(whole(divideFractions(cost, fractionOfPpm(plate.foodCostPpm)))),
  });
}

/**
 * The least whole grams to buy so that so many grams are served. Refuses `plate-nothing-left` as `plateCost` does.
 */
export function portionToBuy(servedGrams: Grams, losses: Pick<Plate, 'cookingLossPpm' | 'wastePpm'>): Result<Grams> {
  const left = servedShare(losses);
  if (left.n <= 0n) return refuse('plate-nothing-left', {}, '/wastePpm');
  return ok(grams(whole(divideFractions(fraction(BigInt(servedGrams)), left), 'up')));
}

/** The share of what was bought that is served. */
const servedShare = ({ cookingLossPpm, wastePpm }: Pick<Plate, 'cookingLossPpm' | 'wastePpm'>): Fraction =>
  multiplyFractions(
    subtractFractions(ONE, fractionOfPpm(cookingLossPpm)),
    subtractFractions(ONE, fractionOfPpm(wastePpm)),
  );

const whole = (value: Fraction, rounding: Rounding = 'half-up'): number => toSafeNumber(roundFraction(value, rounding));
