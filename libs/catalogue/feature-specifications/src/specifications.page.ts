import { ChangeDetectionStrategy, Component, DestroyRef, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import type { SpecificationRow } from '@seamwright/catalogue/contracts';
import { TechnicalApi } from '@seamwright/catalogue/data-access';
import { speciesName } from '@seamwright/catalogue/ui';
import { asProblem, failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import { Card, ErrorState, PageHead } from '@seamwright/shared/ui';
import { DataTable, TableCell, type TableColumn } from '@seamwright/shared/ui/table';
import { catchError, debounceTime, map, of, startWith, Subject, switchMap } from 'rxjs';
import { StageChip } from './stage-chip';

interface Rows {
  readonly items: readonly SpecificationRow[];
  readonly nextCursor: string | null;
}

const REST_MS = 250;

/** Every specification with its newest version and where that stands. */
@Component({
  imports: [Card, DataTable, ErrorState, MatButton, MatFormFieldModule, MatInputModule, PageHead, StageChip, TableCell],
  templateUrl: './specifications.page.html',
  styleUrl: './specifications.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SpecificationsPage {
  readonly #api = inject(TechnicalApi);
  readonly #destroyed = inject(DestroyRef);

  protected readonly words = new Subject<string>();
  protected readonly rows = signal<Remote<Rows>>(idle());
  protected readonly columns: readonly TableColumn<SpecificationRow>[] = [
    { key: 'code', label: $localize`:@@catalogue.technical.code:Code`, kind: 'code' },
    { key: 'name', label: $localize`:@@catalogue.technical.name:Name`, kind: 'text' },
    {
      key: 'species',
      label: $localize`:@@catalogue.technical.species:Species`,
      kind: 'text',
      value: ({ species }) => speciesName(species),
    },
    { key: 'primalName', label: $localize`:@@catalogue.technical.primal:Primal`, kind: 'text' },
    { key: 'version', label: $localize`:@@catalogue.technical.version:Version`, kind: 'count' },
    { key: 'stage', label: $localize`:@@catalogue.technical.stage:Stands`, kind: 'template' },
    {
      key: 'since',
      label: $localize`:@@catalogue.technical.since:Since`,
      kind: 'date',
      value: ({ since }) => since?.slice(0, 10),
    },
  ];
  protected readonly idOf = (row: SpecificationRow): string => row.specificationId;
  protected readonly linkOf = (row: SpecificationRow): string[] => ['/specifications', row.code];
  #q = '';

  constructor() {
    this.words
      .pipe(
        debounceTime(REST_MS),
        startWith(''),
        switchMap((q) => {
          this.#q = q.trim();
          this.rows.update(loading);
          return this.#page(undefined);
        }),
        takeUntilDestroyed(),
      )
      .subscribe((rows) => this.rows.set(rows));
  }

  protected more(): void {
    const before = this.rows().data;
    this.rows.update(loading);
    this.#page(before?.nextCursor ?? undefined, before?.items)
      .pipe(takeUntilDestroyed(this.#destroyed))
      .subscribe((rows) => this.rows.set(rows));
  }

  #page(cursor: string | undefined, before: readonly SpecificationRow[] = []) {
    return this.#api.list({ q: this.#q || undefined, cursor }).pipe(
      map((page) => loaded<Rows>({ ...page, items: [...before, ...page.items] })),
      catchError((error: unknown) => of(failed<Rows>(this.rows(), asProblem(error)))),
    );
  }
}
