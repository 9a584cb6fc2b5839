import { formatPlantDate, isPlantDate } from '@seamwright/shared/util';

/** A refusal's day as people read it, "Thu 3 Dec"; what is no day stays as it is. */
export function day(text: string | number | undefined): string {
  const plain = String(text ?? '');
  return isPlantDate(plain) ? formatPlantDate(plain, 'short') : plain;
}
