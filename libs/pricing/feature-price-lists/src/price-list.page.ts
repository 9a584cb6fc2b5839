import { ChangeDetectionStrategy, Component, computed, effect, inject, input, signal, untracked } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormField, MatLabel } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { Actions, ofType } from '@ngrx/effects';
import { Store } from '@ngrx/store';
import { debounceTime, distinctUntilChanged } from 'rxjs';
import type { PriceListLine } from '@seamwright/pricing/contracts';
import {
  PriceListPageActions,
  PriceListsApiActions,
  priceListsFeature,
  type PriceChange,
} from '@seamwright/pricing/data-access';
import { HOUSE_CURRENCY, type PriceBreak } from '@seamwright/pricing/domain';
import { basisWord, levelWord } from '@seamwright/pricing/ui';
import { Card, Chip, DatePipe, ErrorState, Loading, Money, MoneyPipe, PageHead, Toast } from '@seamwright/shared/ui';
import { DataTable, TableCell, type TableColumn } from '@seamwright/shared/ui/table';
import { breakText } from './break-text';
import { PriceEditor } from './price-editor';

const PAUSE_MS = 250;

/** The prices of one list, now and to come; each can be set anew from a day on. */
@Component({
  selector: 'sw-price-list-page',
  imports: [
    Card,
    Chip,
    DataTable,
    DatePipe,
    ErrorState,
    Loading,
    MatButton,
    MatFormField,
    MatInput,
    MatLabel,
    Money,
    MoneyPipe,
    PageHead,
    PriceEditor,
    ReactiveFormsModule,
    TableCell,
  ],
  templateUrl: './price-list.page.html',
  styleUrl: './price-list.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PriceListPage {
  readonly priceListId = input.required<string>();

  private readonly store = inject(Store);
  private readonly toast = inject(Toast);

  protected readonly list = this.store.selectSignal(priceListsFeature.selectList);
  protected readonly lines = this.store.selectSignal(priceListsFeature.selectLines);
  protected readonly hasMore = this.store.selectSignal(priceListsFeature.selectMoreLines);
  protected readonly setting = this.store.selectSignal(priceListsFeature.selectSetting);
  protected readonly rows = computed(() => this.lines().data ?? []);
  protected readonly loading = computed(() => this.lines().status === 'loading');
  /** Agreed prices are changed by a new quote only. */
  protected readonly editable = computed(() => this.list().data?.level !== 'agreement');
  protected readonly editing = signal<PriceListLine | null>(null);
  protected readonly search = new FormControl('', { nonNullable: true });

  protected readonly currency = HOUSE_CURRENCY;
  protected readonly levelWord = levelWord;
  protected readonly crumbs = [{ label: $localize`:@@priceList.crumb:Price lists`, path: '/price-lists' }];
  protected readonly columns = computed((): readonly TableColumn<PriceListLine>[] => [
    { key: 'code', label: $localize`:@@priceList.column.code:Code`, kind: 'code' },
    { key: 'name', label: $localize`:@@priceList.column.name:Specification`, kind: 'template' },
    { key: 'price', label: $localize`:@@priceList.column.price:Price`, kind: 'template', align: 'end' },
    { key: 'breaks', label: $localize`:@@priceList.column.breaks:From a quantity on`, kind: 'template', align: 'end' },
    { key: 'validFrom', label: $localize`:@@priceList.column.from:From`, kind: 'date' },
    { key: 'validUntil', label: $localize`:@@priceList.column.until:Until before`, kind: 'date' },
    ...(this.editable()
      ? [
          {
            key: 'acts',
            label: $localize`:@@priceList.column.acts:Change`,
            kind: 'template' as const,
            align: 'end' as const,
          },
        ]
      : []),
  ]);
  protected readonly idOf = (line: PriceListLine): string => line.id;
  protected readonly perOf = (line: PriceListLine): string => basisWord(line.basis);
  protected readonly fromText = (line: PriceListLine, each: PriceBreak): string =>
    breakText(line.basis, each.fromQuantity);

  constructor() {
    effect(() => {
      this.priceListId();
      untracked(() => this.load());
    });
    this.search.valueChanges
      .pipe(debounceTime(PAUSE_MS), distinctUntilChanged(), takeUntilDestroyed())
      .subscribe((q) => this.store.dispatch(PriceListPageActions.searched({ q: q.trim() })));
    inject(Actions)
      .pipe(ofType(PriceListsApiActions.priceChanged), takeUntilDestroyed())
      .subscribe(({ line }) => {
        this.editing.set(null);
        void this.toast.show({ text: $localize`:@@priceList.setToast:The price of ${line.name}:name: is set.` });
      });
  }

  protected load(): void {
    this.store.dispatch(PriceListPageActions.opened({ priceListId: this.priceListId() }));
  }

  protected more(): void {
    this.store.dispatch(PriceListPageActions.moreWanted());
  }

  protected edit(line: PriceListLine): void {
    this.store.dispatch(PriceListPageActions.editOpened());
    this.editing.set(line);
  }

  protected set(line: PriceListLine, change: PriceChange): void {
    this.store.dispatch(PriceListPageActions.priceSet({ line, change }));
  }
}
