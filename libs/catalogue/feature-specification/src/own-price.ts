import { computed, inject, Injectable, LOCALE_ID, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { catchError, concat, debounceTime, map, of, switchMap, type Observable } from 'rxjs';
import type { ResolvedOffer } from '@seamwright/catalogue/domain';
import { DeliveryDays } from '@seamwright/ordering/data-access';
import { PriceChecks, type PricedLine } from '@seamwright/pricing/data-access';
import { basisWord, priceWhyParts } from '@seamwright/pricing/ui';
import { asProblem } from '@seamwright/shared/data-access';
import type { ProblemText } from '@seamwright/shared/ui';
import {
  divideHalfUp,
  formatPlantDate,
  isPlantDate,
  minorUnits,
  priceForGrams,
  toSafeNumber,
  type CurrencyCode,
  type Quantity,
} from '@seamwright/shared/util';
import type { ShownPrice } from './buy-box';

/** What a price is asked for. */
export interface PriceQuestion {
  readonly specificationId: string;
  readonly resolved: ResolvedOffer;
  readonly chosen: Readonly<Record<string, string>>;
  readonly quantity: Quantity;
}

interface Priced {
  readonly loading: boolean;
  readonly price: ShownPrice | null;
  readonly problem: ProblemText | null;
}

const NOTHING: Priced = { loading: false, price: null, problem: null };
/** Typing and choosing settle before the server is asked. */
const SETTLE_MS = 150;
const CURRENCY: CurrencyCode = 'GBP';

/** The buyer's own price of what is chosen on the page, for the next day she can have it. */
@Injectable()
export class OwnPrice {
  readonly #days = inject(DeliveryDays);
  readonly #checks = inject(PriceChecks);
  readonly #locale = inject(LOCALE_ID);
  readonly #question = signal<PriceQuestion | null>(null);
  readonly #again = signal(0);

  readonly #day = toSignal(
    this.#days.next({ count: 3 }).pipe(
      map(({ days }) => days.find(({ closed }) => !closed)?.day ?? null),
      catchError(() => of(null)),
    ),
    { initialValue: undefined },
  );
  readonly #asked = computed(() => ({ question: this.#question(), day: this.#day(), again: this.#again() }));
  readonly #priced = toSignal(
    toObservable(this.#asked).pipe(
      debounceTime(SETTLE_MS),
      switchMap(({ question, day }) => (question && day ? this.#ask(question, day) : of(NOTHING))),
    ),
    { initialValue: { ...NOTHING, loading: true } },
  );

  readonly loading = computed(() => this.#priced().loading);
  readonly price = computed(() => this.#priced().price);
  readonly problem = computed(() => this.#priced().problem);
  /** "Your price, Fri 4 Dec" */
  readonly heading = computed(() => {
    const day = this.#day();
    return day && isPlantDate(day)
      ? $localize`:@@catalogue.buy.priceFor:Your price, ${formatPlantDate(day, 'short', this.#locale)}:day:`
      : $localize`:@@catalogue.buy.price:Your price`;
  });

  ask(question: PriceQuestion | null): void {
    this.#question.set(question);
  }

  askAgain(): void {
    this.#again.update((count) => count + 1);
  }

  #ask(question: PriceQuestion, deliveryDay: string): Observable<Priced> {
    const { specificationId, chosen, quantity } = question;
    const lines = [{ specificationId, chosen: { ...chosen }, quantity }];
    const before = this.#priced().price;
    return concat(
      of<Priced>({ loading: before === null, price: before, problem: null }),
      this.#checks.check({ deliveryDay, lines }).pipe(
        map((answer) => this.#shown(answer.lines[0], question.resolved)),
        catchError((error: unknown) => of<Priced>({ ...NOTHING, problem: asProblem(error) })),
      ),
    );
  }

  #shown(line: PricedLine | undefined, { piece }: ResolvedOffer): Priced {
    if (!line) return NOTHING;
    if (!line.ok) {
      const title = $localize`:@@catalogue.buy.noPrice:No price for this yet`;
      return { ...NOTHING, problem: { title, detail: line.message } };
    }
    const { price, amounts, weights } = line;
    const pieceMinor = {
      kg: () => priceForGrams(piece.nominalGrams, minorUnits(price.priceMinor)),
      piece: () => null,
      case: () => toSafeNumber(divideHalfUp(BigInt(amounts.estimateMinor), BigInt(weights.pieces))),
    }[price.basis]();
    return {
      ...NOTHING,
      price: {
        priceMinor: price.priceMinor,
        per: basisWord(price.basis),
        pieceMinor,
        ...amounts,
        why: priceWhyParts(price, { currency: CURRENCY, locale: this.#locale }),
      },
    };
  }
}
