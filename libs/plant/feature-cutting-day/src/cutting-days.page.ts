import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Store } from '@ngrx/store';
import { cuttingDayStateName, type CuttingDayWire } from '@seamwright/plant/contracts';
import { CuttingDayListPageActions, cuttingDaysFeature } from '@seamwright/plant/data-access';
import { Card, Chip, Empty, ErrorState, PageHead } from '@seamwright/shared/ui';
import { DataTable, TableCell, type TableColumn } from '@seamwright/shared/ui/table';
import { dayTone } from './day-words';

/** All cutting days, the latest first: where each stands and how much of it is packed. */
@Component({
  imports: [Card, Chip, DataTable, Empty, ErrorState, MatButton, PageHead, TableCell],
  templateUrl: './cutting-days.page.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CuttingDaysPage {
  private readonly store = inject(Store);

  protected readonly list = this.store.selectSignal(cuttingDaysFeature.selectList);
  protected readonly nextCursor = this.store.selectSignal(cuttingDaysFeature.selectNextCursor);

  protected readonly columns: readonly TableColumn<CuttingDayWire>[] = [
    { key: 'deliveryDay', label: $localize`:@@cuttingDays.delivery:For delivery on`, kind: 'date' },
    { key: 'cuttingDay', label: $localize`:@@cuttingDays.cutting:Cut on`, kind: 'date' },
    { key: 'state', label: $localize`:@@cuttingDays.state:State`, kind: 'template' },
    { key: 'orders', label: $localize`:@@cuttingDays.orders:Orders`, kind: 'count' },
    { key: 'lines', label: $localize`:@@cuttingDays.lines:Lines`, kind: 'count' },
    { key: 'waitingOrders', label: $localize`:@@cuttingDays.waiting:Waiting`, kind: 'count' },
    { key: 'packedOrders', label: $localize`:@@cuttingDays.packed:Packed`, kind: 'count' },
  ];
  protected readonly rowId = ({ id }: CuttingDayWire): string => id;
  protected readonly rowLink = ({ deliveryDay }: CuttingDayWire): string[] => [deliveryDay];
  protected readonly stateName = cuttingDayStateName;
  protected readonly tone = dayTone;

  constructor() {
    this.load();
  }

  protected load(): void {
    this.store.dispatch(CuttingDayListPageActions.opened());
  }

  protected more(): void {
    this.store.dispatch(CuttingDayListPageActions.moreWanted());
  }
}
