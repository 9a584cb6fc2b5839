import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  untracked,
  type Signal,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Site } from '@seamwright/identity/domain';
import { Card, Chip, Empty, ErrorState, Icon, Loading, Toast, type ProblemText } from '@seamwright/shared/ui';
import { differences } from './differences';
import { NewerState } from './newer-state';
import { SiteForm, type SiteFormValue } from './site-form';

/** What the board shows and asks for; the page brings one. */
export interface SitesDesk {
  readonly sites: Signal<readonly Site[] | null>;
  readonly problem: Signal<ProblemText | null>;
  readonly editing: Signal<Site | 'new' | null>;
  readonly saving: Signal<boolean>;
  readonly refused: Signal<ProblemText | null>;
  readonly newer: Signal<{ readonly read: Site; readonly now: Site } | null>;
  readonly done: Signal<{ readonly name: string } | null>;
  load(): void;
  begin(site: Site | 'new'): void;
  leave(): void;
  save(value: SiteFormValue): void;
  takeNewer(): void;
  keepMine(): void;
}

/** The places that a customer is delivered to, and the form for the one that is being added or changed. */
@Component({
  selector: 'sw-sites-board',
  imports: [Card, Chip, Empty, ErrorState, Icon, Loading, MatButton, NewerState, SiteForm],
  templateUrl: './sites-board.html',
  styleUrl: './sites-board.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SitesBoard {
  readonly desk = input.required<SitesDesk>();
  /** Whether sites can be added and changed here. */
  readonly editable = input(true);

  readonly #toast = inject(Toast);
  protected readonly newHeading = $localize`:@@identity.sites.add:Add an address`;
  protected readonly changing = computed(() => {
    const editing = this.desk().editing();
    return editing === 'new' ? null : editing;
  });
  protected readonly newerValues = computed(() => {
    const newer = this.desk().newer();
    return newer ? differences(newer.read, newer.now, FIELDS) : [];
  });

  constructor() {
    effect(() => {
      const done = this.desk().done();
      if (done)
        untracked(
          () => void this.#toast.show({ text: $localize`:@@identity.site.saved:${done.name}:name: was saved.` }),
        );
    });
  }
}

const FIELDS = [
  { key: 'name', label: $localize`:@@identity.site.name:Name of the site` },
  { key: 'address', label: $localize`:@@identity.site.address:Address` },
  { key: 'postcode', label: $localize`:@@identity.site.postcode:Postcode` },
  { key: 'contactName', label: $localize`:@@identity.site.contact:Who receives deliveries` },
  { key: 'phone', label: $localize`:@@identity.site.phone:Telephone` },
  { key: 'accessNotes', label: $localize`:@@identity.site.access:How the driver gets in` },
] as const;
