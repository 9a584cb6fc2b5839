import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { FormControl, FormGroup, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormField, MatLabel } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatOption, MatSelect } from '@angular/material/select';
import { Store } from '@ngrx/store';
import { debounceTime, distinctUntilChanged } from 'rxjs';
import type { PriceList } from '@seamwright/pricing/contracts';
import { priceListsFeature, PriceListsPageActions } from '@seamwright/pricing/data-access';
import { PRICE_LEVELS, type PriceLevel } from '@seamwright/pricing/domain';
import { levelWord } from '@seamwright/pricing/ui';
import { Card, ErrorState, PageHead } from '@seamwright/shared/ui';
import { DataTable, type TableColumn } from '@seamwright/shared/ui/table';

const PAUSE_MS = 250;

/** All price lists, found by level and by the words of their name, customer or group. */
@Component({
  selector: 'sw-price-lists-page',
  imports: [
    Card,
    DataTable,
    ErrorState,
    MatButton,
    MatFormField,
    MatInput,
    MatLabel,
    MatOption,
    MatSelect,
    PageHead,
    ReactiveFormsModule,
  ],
  templateUrl: './price-lists.page.html',
  styles: `
    form {
      display: flex;
      flex-wrap: wrap;
      gap: 16px;
    }

    mat-form-field {
      flex: 0 1 280px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PriceListsPage {
  private readonly store = inject(Store);

  protected readonly lists = this.store.selectSignal(priceListsFeature.selectLists);
  protected readonly hasMore = this.store.selectSignal(priceListsFeature.selectMoreLists);
  protected readonly rows = computed(() => this.lists().data ?? []);
  protected readonly loading = computed(() => this.lists().status === 'loading');
  protected readonly search = new FormGroup({
    q: new FormControl('', { nonNullable: true }),
    level: new FormControl<PriceLevel | ''>('', { nonNullable: true }),
  });

  protected readonly levels = PRICE_LEVELS;
  protected readonly wordOf = levelWord;
  protected readonly columns: readonly TableColumn<PriceList>[] = [
    { key: 'name', label: $localize`:@@priceLists.column.name:List`, kind: 'text' },
    {
      key: 'level',
      label: $localize`:@@priceLists.column.level:Level`,
      kind: 'text',
      value: ({ level }) => levelWord(level),
    },
    { key: 'owner', label: $localize`:@@priceLists.column.owner:For`, kind: 'text', value: (list) => ownerOf(list) },
    { key: 'lineCount', label: $localize`:@@priceLists.column.lines:Prices`, kind: 'count' },
  ];
  protected readonly idOf = (list: PriceList): string => list.id;
  protected readonly linkOf = (list: PriceList): readonly string[] => ['/price-lists', list.id];

  constructor() {
    this.load();
    this.search.valueChanges
      .pipe(
        debounceTime(PAUSE_MS),
        distinctUntilChanged((one, other) => one.q === other.q && one.level === other.level),
        takeUntilDestroyed(),
      )
      .subscribe(() => this.load());
  }

  protected load(): void {
    const { q, level } = this.search.getRawValue();
    this.store.dispatch(PriceListsPageActions.searched({ search: { q: q.trim(), level: level || null } }));
  }

  protected more(): void {
    this.store.dispatch(PriceListsPageActions.moreWanted());
  }
}

const ownerOf = ({ owner }: PriceList): string => owner ?? $localize`:@@priceLists.everybody:everybody`;
