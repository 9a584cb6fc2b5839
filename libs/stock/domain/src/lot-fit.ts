import { ok, refuse, type PlantDate, type Result } from '@seamwright/shared/util';
import type { Lot } from './lot';

export interface DayOfUse {
  readonly cuttingDay: PlantDate;
  readonly deliveryDay: PlantDate;
}

type Judged = Pick<Lot, 'code' | 'state' | 'receivedOn' | 'useBy'>;

/**
 * Whether a lot may be cut for a day: released, in the chiller by the cutting day, and not past its use-by when it is
 * delivered. Refuses with `lot-not-released` (lot, state), `lot-not-received-yet` (lot, day) or `lot-past-use-by`
 * (lot, useBy).
 */
export function lotFit(lot: Judged, day: DayOfUse): Result<true> {
  if (lot.state !== 'released') return refuse('lot-not-released', { lot: lot.code, state: lot.state });
  if (lot.receivedOn > day.cuttingDay) return refuse('lot-not-received-yet', { lot: lot.code, day: lot.receivedOn });
  if (lot.useBy !== null && lot.useBy < day.deliveryDay)
    return refuse('lot-past-use-by', { lot: lot.code, useBy: lot.useBy });
  return ok(true);
}

/** First expired, first out: by use-by (a lot without one last), then by arrival, then by code. */
export function firstExpiredFirst(a: Pick<Lot, 'useBy' | 'receivedOn' | 'code'>, b: typeof a): number {
  return (
    compare(a.useBy ?? '9999-12-31', b.useBy ?? '9999-12-31') ||
    compare(a.receivedOn, b.receivedOn) ||
    compare(a.code, b.code)
  );
}

const compare = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);
