import { ChangeDetectionStrategy, Component, computed, effect, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router } from '@angular/router';
import { Store } from '@ngrx/store';
import {
  catalogueListFeature,
  CatalogueListPageActions,
  type CatalogueFilters,
} from '@seamwright/catalogue/data-access';
import { BONE_STATES, SPECIES, type BoneState, type Species } from '@seamwright/catalogue/domain';
import { Empty, ErrorState, Loading, PageHead } from '@seamwright/shared/ui';
import { CatalogueFilterPanel } from './catalogue-filter-panel';
import { CardPrices } from './card-prices';
import { CatalogueSearch } from './catalogue-search';
import { SpecificationCardLink } from './specification-card';

const pathOf = (url: string): string | undefined => url.split(/[?#]/)[0];
const oneOf = <T extends string>(list: readonly T[], value: string | undefined): T | undefined =>
  list.find((each) => each === value);

/** The catalogue: searched by words, narrowed by species, primal and bone; its address says what is shown. */
@Component({
  imports: [
    CatalogueFilterPanel,
    CatalogueSearch,
    Empty,
    ErrorState,
    Loading,
    MatButton,
    PageHead,
    SpecificationCardLink,
  ],
  providers: [CardPrices],
  templateUrl: './catalogue.page.html',
  styleUrl: './catalogue.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CataloguePage {
  // From the address.
  readonly q = input<string>();
  readonly species = input<string>();
  readonly primal = input<string>();
  readonly bone = input<string>();

  readonly #store = inject(Store);
  readonly #router = inject(Router);

  protected readonly own = inject(CardPrices);
  protected readonly found = this.#store.selectSignal(catalogueListFeature.selectFound);
  protected readonly cards = this.#store.selectSignal(catalogueListFeature.selectCards);
  protected readonly counts = this.#store.selectSignal(catalogueListFeature.selectCounts);
  protected readonly hasMore = this.#store.selectSignal(catalogueListFeature.selectHasMore);
  protected readonly loadingMore = this.#store.selectSignal(catalogueListFeature.selectLoadingMore);

  protected readonly filters = computed<CatalogueFilters>(() => ({
    q: this.q()?.trim() || undefined,
    species: oneOf<Species>(SPECIES, this.species()),
    primal: this.primal() || undefined,
    boneState: oneOf<BoneState>(BONE_STATES, this.bone()),
  }));
  protected readonly isNarrowed = computed(() => Object.values(this.filters()).some((value) => value !== undefined));

  constructor() {
    effect(() => this.#store.dispatch(CatalogueListPageActions.searchAsked({ filters: this.filters() })));
    effect(() => this.own.show(this.cards().map(({ specificationId }) => specificationId)));
  }

  protected search(words: string): void {
    // Words that come to rest while a page is being opened must not call the buyer back from it.
    const going = this.#router.currentNavigation();
    if (going && pathOf(this.#router.serializeUrl(going.extractedUrl)) !== pathOf(this.#router.url)) return;
    void this.#router.navigate([], {
      queryParams: { q: words || null },
      queryParamsHandling: 'merge',
      replaceUrl: true,
    });
  }

  protected showAll(): void {
    void this.#router.navigate([], { queryParams: {} });
  }

  protected more(): void {
    this.#store.dispatch(CatalogueListPageActions.moreAsked());
  }

  protected tryAgain(): void {
    this.#store.dispatch(CatalogueListPageActions.tryAgainAsked());
  }
}
