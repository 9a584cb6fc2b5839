import { computed, inject, Injectable, LOCALE_ID, signal } from '@angular/core';
import { takeUntilDestroyed, toObservable, toSignal } from '@angular/core/rxjs-interop';
import { catchError, EMPTY, map, of, switchMap } from 'rxjs';
import { DeliveryDays } from '@seamwright/ordering/data-access';
import { PriceChecks, type PricedLine } from '@seamwright/pricing/data-access';
import { basisWord } from '@seamwright/pricing/ui';
import { formatPlantDate, isPlantDate } from '@seamwright/shared/util';

/** The buyer's own price as a card shows it; whole minor units. Null in its place: there is none, it is asked for. */
export interface CardPrice {
  readonly priceMinor: number;
  /** What it is for, in a word: "kg", "case". */
  readonly per: string;
  /** About what one piece comes to; null when the price is not by weight. */
  readonly pieceMinor: number | null;
}

type Prices = ReadonlyMap<string, CardPrice | null>;

/**
 * The buyer's own prices of the cards on the page, each with its usual choices, for the next day she can have them. One
 * question for all cards that have none yet; a question that fails leaves the cards as they are.
 */
@Injectable()
export class CardPrices {
  readonly #checks = inject(PriceChecks);
  readonly #locale = inject(LOCALE_ID);
  readonly #shown = signal<readonly string[]>([]);
  readonly #prices = signal<Prices>(new Map());
  readonly #day = toSignal(
    inject(DeliveryDays)
      .next({ count: 3 })
      .pipe(
        map(({ days }) => days.find(({ closed }) => !closed)?.day ?? null),
        catchError(() => of(null)),
      ),
    { initialValue: null },
  );

  /** By the specification's id. */
  readonly prices = this.#prices.asReadonly();
  /** "Your prices for Fri 4 Dec, before tax"; empty until there are any. */
  readonly words = computed(() => {
    const day = this.#day();
    return this.#prices().size > 0 && day && isPlantDate(day)
      ? $localize`:@@catalogue.list.prices:Your prices for ${formatPlantDate(day, 'short', this.#locale)}:day:, before tax`
      : '';
  });

  constructor() {
    toObservable(computed(() => ({ day: this.#day(), shown: this.#shown() })))
      .pipe(
        switchMap(({ day, shown }) => {
          const unpriced = shown.filter((id) => !this.#prices().has(id));
          return day === null || unpriced.length === 0 ? EMPTY : this.#ask(day, unpriced);
        }),
        takeUntilDestroyed(),
      )
      .subscribe((found) => this.#prices.update((known) => new Map([...known, ...found])));
  }

  /** Tells which specifications are on the page, by id. */
  show(specificationIds: readonly string[]): void {
    this.#shown.set(specificationIds);
  }

  #ask(deliveryDay: string, ids: readonly string[]) {
    const lines = ids.map((specificationId) => ({
      specificationId,
      chosen: {},
      quantity: { unit: 'piece' as const, count: 1 },
    }));
    return this.#checks.check({ deliveryDay, lines }).pipe(
      map((answer): Prices => new Map(ids.map((id, at) => [id, priceOf(answer.lines[at])]))),
      catchError(() => EMPTY),
    );
  }
}

function priceOf(line: PricedLine | undefined): CardPrice | null {
  if (!line?.ok) return null;
  const { price, amounts } = line;
  return {
    priceMinor: price.priceMinor,
    per: basisWord(price.basis),
    pieceMinor: price.basis === 'kg' ? amounts.estimateMinor : null,
  };
}
