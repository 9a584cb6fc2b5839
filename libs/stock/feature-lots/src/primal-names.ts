import { inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { catchError, map, of } from 'rxjs';
import { primalName } from '@seamwright/catalogue/domain';
import type { LotWire } from '@seamwright/stock/contracts';
import { LotReceipts } from '@seamwright/stock/data-access';

const NONE: ReadonlyMap<string, string> = new Map();

/** Tells a lot's primal with its species; until that is known, and when it can't be asked, by its plain name. */
export function primalNames(): (lot: LotWire) => string {
  const names = toSignal(
    inject(LotReceipts)
      .primals()
      .pipe(
        map(
          ({ items }): ReadonlyMap<string, string> =>
            new Map(items.map(({ id, species, name }) => [id, primalName(species, name)])),
        ),
        catchError(() => of(NONE)),
      ),
    { initialValue: NONE },
  );
  return ({ nodeId, nodeName }) => names().get(nodeId) ?? nodeName;
}
