import { daysBetween, formatPlantDate, isPlantDate, plantToday, type PlantDate } from '@seamwright/shared/util';

export const PLANT_ZONE = 'Europe/London';

/** The day it is at the plant. */
export const today = (): PlantDate => plantToday(new Date(), PLANT_ZONE);

/** "Wed 2 Dec". */
export const inWords = (day: string, locale: string): string =>
  isPlantDate(day) ? formatPlantDate(day, 'short', locale) : day;

/** Whole days from `from` to `day`; below zero when it is over. A text that is no day lies infinitely far. */
export const daysAhead = (day: string, from: PlantDate): number =>
  isPlantDate(day) ? daysBetween(from, day) : Number.POSITIVE_INFINITY;
