import { ChangeDetectionStrategy, Component, computed, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { CatalogueCounts, CatalogueFilters } from '@seamwright/catalogue/data-access';
import { boneStateName, speciesName } from '@seamwright/catalogue/ui';
import { Icon } from '@seamwright/shared/ui';

interface FilterValue {
  readonly name: string;
  readonly count: number;
  readonly on: boolean;
  /** What the address says after it is pressed: set, or taken off again. */
  readonly query: Readonly<Record<string, string | null>>;
}

/**
 * What the catalogue can be narrowed to, each with how many it would leave. Pressed again, a filter is taken off. On a
 * small screen it is folded away behind a button, with what is on beside it.
 */
@Component({
  selector: 'sw-catalogue-filter-panel',
  imports: [Icon, MatButton, RouterLink],
  templateUrl: './catalogue-filter-panel.html',
  styleUrl: './catalogue-filter-panel.scss',
  host: { role: 'navigation', '[attr.aria-label]': 'label' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CatalogueFilterPanel {
  readonly filters = input.required<CatalogueFilters>();
  readonly counts = input.required<CatalogueCounts>();
  /** How many cards are shown, and whether there are more than those. */
  readonly found = input.required<number>();
  readonly more = input(false);

  protected readonly open = signal(false);
  protected readonly label = $localize`:@@catalogue.filter.label:Narrow the catalogue`;
  protected readonly showWords = computed(() => {
    const found = this.found();
    if (found === 0) return $localize`:@@catalogue.filter.nothing:Nothing fits: take a filter off`;
    if (found === 1) return $localize`:@@catalogue.filter.showOne:Show one cut`;
    return this.more()
      ? $localize`:@@catalogue.filter.showAll:Show what fits`
      : $localize`:@@catalogue.filter.show:Show ${found}:count: cuts`;
  });
  protected readonly groups = computed(() => {
    const { species, primal, boneState } = this.filters();
    const counts = this.counts();
    return [
      {
        name: $localize`:@@catalogue.filter.species:Species`,
        values: counts.species.map(({ species: each, count }): FilterValue => {
          const on = each === species;
          // A primal belongs to one species, so a new species takes it off.
          return { name: speciesName(each), count, on, query: { species: on ? null : each, primal: null } };
        }),
      },
      {
        name: $localize`:@@catalogue.filter.primal:Primal`,
        values: counts.primals.map(({ id, name, species: of, count }): FilterValue => {
          const on = id === primal;
          const full = species ? name : `${speciesName(of)} – ${name}`;
          return { name: full, count, on, query: { primal: on ? null : id } };
        }),
      },
      {
        name: $localize`:@@catalogue.filter.bone:Bone`,
        values: counts.boneStates.map(({ boneState: each, count }): FilterValue => {
          const on = each === boneState;
          return { name: boneStateName(each), count, on, query: { bone: on ? null : each } };
        }),
      },
    ].filter(({ values }) => values.length > 0);
  });
  protected readonly on = computed(() => this.groups().flatMap(({ values }) => values.filter(({ on }) => on)));
}
