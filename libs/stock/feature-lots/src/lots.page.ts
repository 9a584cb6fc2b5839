import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { Store } from '@ngrx/store';
import type { LotWire } from '@seamwright/stock/contracts';
import { LotListPageActions, lotsFeature } from '@seamwright/stock/data-access';
import { LOT_STATES, type LotState } from '@seamwright/stock/domain';
import { Card, Chip, DatePipe, Empty, ErrorState, Icon, PageHead } from '@seamwright/shared/ui';
import { DataTable, TableCell, type TableColumn } from '@seamwright/shared/ui/table';
import { plantToday } from '@seamwright/shared/util';
import { mayDecideLots } from './lot-deciders';
import { lotStateName, lotTone } from './lot-words';
import { primalNames } from './primal-names';

/** What is in the chiller, first expired first. */
@Component({
  imports: [Card, Chip, DataTable, DatePipe, Empty, ErrorState, Icon, MatButton, PageHead, RouterLink, TableCell],
  templateUrl: './lots.page.html',
  styles: `
    a sw-icon {
      margin-inline-end: 8px;
    }

    .over {
      display: block;
      color: var(--sw-brick);
    }

    select {
      min-block-size: var(--sw-field);
      padding-inline: 12px;
      border: 1px solid var(--sw-edge);
      border-radius: var(--sw-radius);
      background: var(--sw-board);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LotsPage {
  private readonly store = inject(Store);

  protected readonly list = this.store.selectSignal(lotsFeature.selectList);
  protected readonly shown = this.store.selectSignal(lotsFeature.selectShown);
  protected readonly nextCursor = this.store.selectSignal(lotsFeature.selectNextCursor);
  protected readonly mayReceive = mayDecideLots();
  protected readonly states = LOT_STATES;
  protected readonly stateName = lotStateName;
  protected readonly tone = lotTone;

  protected readonly columns: readonly TableColumn<LotWire>[] = [
    { key: 'code', label: $localize`:@@lots.code:Lot`, kind: 'code' },
    { key: 'primal', label: $localize`:@@lots.primal:Primal`, kind: 'text', value: primalNames() },
    { key: 'useBy', label: $localize`:@@lots.useBy:Use by`, kind: 'date' },
    { key: 'state', label: $localize`:@@lots.state:State`, kind: 'template' },
    { key: 'receivedPieces', label: $localize`:@@lots.pieces:Pieces in`, kind: 'count' },
    { key: 'receivedGrams', label: $localize`:@@lots.received:Received, kg`, kind: 'kg' },
    { key: 'remainingGrams', label: $localize`:@@lots.remaining:Left by yield, kg`, kind: 'kg' },
    { key: 'supplier', label: $localize`:@@lots.supplier:Supplier`, kind: 'text' },
  ];
  /** Something is left of it that may not be used any more. */
  protected readonly isOver = ({ remainingGrams, state, useBy }: LotWire): boolean =>
    useBy !== null && remainingGrams > 0 && state !== 'used-up' && useBy < plantToday(new Date(), 'Europe/London');
  protected readonly rowId = ({ id }: LotWire): string => id;
  protected readonly rowLink = ({ id }: LotWire): string[] => [id];

  constructor() {
    this.show(this.shown());
  }

  protected show(state: LotState | null): void {
    this.store.dispatch(LotListPageActions.opened({ state }));
  }

  protected choose(value: string): void {
    this.show(LOT_STATES.find((state) => state === value) ?? null);
  }

  protected more(): void {
    this.store.dispatch(LotListPageActions.moreWanted());
  }
}
