import { ChangeDetectionStrategy, Component, computed, effect, inject, input, signal } from '@angular/core';
import { Router } from '@angular/router';
import { Title } from '@angular/platform-browser';
import { Store } from '@ngrx/store';
import { specificationFeature, SpecificationPageActions } from '@seamwright/catalogue/data-access';
import { drawnNumbers } from '@seamwright/catalogue/domain';
import { SpecChoices, SpecDrawing, speciesName, type ValueChosen } from '@seamwright/catalogue/ui';
import { BasketActions } from '@seamwright/ordering/data-access';
import { Card, Chip, ErrorState, Loading, PageHead, Toast, type Crumb } from '@seamwright/shared/ui';
import { BuyBox, type OrderUnit } from './buy-box';
import { amountIn, quantityOf, weightsOf } from './order-quantity';
import { OwnPrice } from './own-price';
import { SpecificationDetails } from './specification-details';
import { SpecificationFacts } from './specification-facts';
import { SpecificationMethod } from './specification-method';

/** One specification: its drawing redrawn with each choice, its numbers, how it is cut, and what to know of it. */
@Component({
  imports: [
    BuyBox,
    Card,
    Chip,
    ErrorState,
    Loading,
    PageHead,
    SpecChoices,
    SpecDrawing,
    SpecificationDetails,
    SpecificationFacts,
    SpecificationMethod,
  ],
  providers: [OwnPrice],
  templateUrl: './specification.page.html',
  styleUrl: './specification.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SpecificationPage {
  /** From the address. */
  readonly code = input.required<string>();

  readonly #store = inject(Store);
  readonly #title = inject(Title);
  readonly #toast = inject(Toast);
  readonly #router = inject(Router);

  protected readonly own = inject(OwnPrice);
  readonly #question = computed(() => {
    const [specification, resolved, quantity] = [this.remote().data, this.resolved(), this.quantity()];
    if (!specification || !resolved || !quantity) return null;
    return { specificationId: specification.specificationId, resolved, chosen: this.chosen(), quantity };
  });

  protected readonly remote = this.#store.selectSignal(specificationFeature.selectSpecification);
  protected readonly offer = this.#store.selectSignal(specificationFeature.selectOffer);
  /** What is chosen, and the version with it applied: what a price is asked for. */
  readonly chosen = this.#store.selectSignal(specificationFeature.selectChosen);
  readonly resolved = this.#store.selectSignal(specificationFeature.selectResolved);
  readonly unit = signal<OrderUnit>('piece');
  readonly amount = signal<number | null>(1);
  readonly quantity = computed(() => quantityOf(this.unit(), this.amount()));
  readonly weights = computed(() => weightsOf(this.resolved(), this.quantity()));

  protected readonly numbers = computed(() => {
    const resolved = this.resolved();
    return resolved && drawnNumbers(resolved);
  });
  protected readonly crumbs = computed<Crumb[]>(() => {
    const specification = this.remote().data;
    const species = specification?.species;
    return [
      { label: $localize`:@@catalogue.crumb:Catalogue`, path: '/catalogue' },
      ...(species ? [{ label: speciesName(species) }] : []),
      ...(specification?.path ?? [])
        .filter(({ level }) => level === 'primal' || level === 'sub-primal')
        .map(({ name }) => ({ label: name })),
    ];
  });
  /** Trying again can't bring back what was withdrawn or never was. */
  protected readonly retryable = computed(() => this.remote().problem?.status !== 404);

  constructor() {
    effect(() => this.#store.dispatch(SpecificationPageActions.opened({ code: this.code() })));
    effect(() => this.own.ask(this.#question()));
    effect(() => {
      const name = this.remote().data?.name;
      if (name) this.#title.setTitle(`${name} · Seamwright`);
    });
  }

  protected choose(chosen: ValueChosen): void {
    this.#store.dispatch(SpecificationPageActions.valueChosen(chosen));
  }

  protected changeUnit(unit: OrderUnit): void {
    const resolved = this.resolved();
    if (resolved) this.amount.set(amountIn(unit, resolved, this.weights()));
    this.unit.set(unit);
  }

  protected async addToBasket(): Promise<void> {
    const [specification, question] = [this.remote().data, this.#question()];
    if (!specification || !question) return;
    const { specificationId, resolved, chosen, quantity } = question;
    const { code, name } = specification;
    const line = { specificationId, code, name, summary: resolved.summary, chosen: { ...chosen }, quantity };
    this.#store.dispatch(BasketActions.lineAdded({ ...line, whenShort: 'send-what-there-is', note: '' }));
    const text = $localize`:@@catalogue.buy.added:${name}:name: is in the basket`;
    const act = $localize`:@@catalogue.buy.toBasket:See basket`;
    if (await this.#toast.show({ text, act })) await this.#router.navigateByUrl('/basket');
  }

  protected tryAgain(): void {
    this.#store.dispatch(SpecificationPageActions.tryAgainAsked());
  }
}
