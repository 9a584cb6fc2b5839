import { ChangeDetectionStrategy, Component, computed, effect, inject, signal } from '@angular/core';
import { takeUntilDestroyed, toObservable, toSignal } from '@angular/core/rxjs-interop';
import { FormArray, FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatAutocomplete, MatAutocompleteTrigger, MatOption } from '@angular/material/autocomplete';
import { MatButton } from '@angular/material/button';
import { MatError, MatFormField, MatHint, MatLabel } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { Router, RouterLink } from '@angular/router';
import { Actions, ofType } from '@ngrx/effects';
import { Store } from '@ngrx/store';
import { catchError, combineLatest, debounceTime, EMPTY, map, merge, of, startWith, switchMap } from 'rxjs';
import type { SpecificationCard } from '@seamwright/catalogue/contracts';
import type { CustomerView } from '@seamwright/identity/contracts';
import type { NewQuoteWire } from '@seamwright/pricing/contracts';
import {
  NewQuotePageActions,
  PriceChecks,
  QuotesApiActions,
  quotesFeature,
  type PricedLine,
} from '@seamwright/pricing/data-access';
import { asProblem } from '@seamwright/shared/data-access';
import { Card, Empty, PageHead } from '@seamwright/shared/ui';
import { FieldError, FormErrors, showServerErrors } from '@seamwright/shared/ui/forms';
import { newId } from '@seamwright/shared/util';
import { draftOf, priceOf, type QuoteLineDraft, type QuoteLineForm } from './quote-line-draft';
import { QuoteLineEditor } from './quote-line-editor';
import { QuotePickers } from './quote-pickers';
import { proposedDates } from './proposed-dates';

/** How long a rep may pause while typing before the desk is asked. */
const PAUSE_MS = 250;

type Problems = readonly { readonly pointer: string; readonly message: string }[];

/** A rep writes a quote: for whom, on which days, and at which prices. */
@Component({
  selector: 'sw-new-quote-page',
  imports: [
    Card,
    Empty,
    FieldError,
    FormErrors,
    MatAutocomplete,
    MatAutocompleteTrigger,
    MatButton,
    MatError,
    MatFormField,
    MatHint,
    MatInput,
    MatLabel,
    MatOption,
    PageHead,
    QuoteLineEditor,
    ReactiveFormsModule,
    RouterLink,
  ],
  templateUrl: './new-quote.page.html',
  styleUrl: './new-quote.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NewQuotePage {
  private readonly store = inject(Store);
  private readonly router = inject(Router);
  private readonly pickers = inject(QuotePickers);
  private readonly priceChecks = inject(PriceChecks);

  protected readonly form = new FormGroup({
    /** The picked customer, or what is typed while none is. */
    customerId: new FormControl<CustomerView | string>('', { nonNullable: true, validators: isPicked }),
    pricesFrom: new FormControl('', { nonNullable: true, validators: Validators.required }),
    pricesUntil: new FormControl('', { nonNullable: true, validators: Validators.required }),
    answerBy: new FormControl('', { nonNullable: true, validators: Validators.required }),
    notes: new FormControl('', { nonNullable: true, validators: Validators.maxLength(2000) }),
    lines: new FormArray<QuoteLineForm>([]),
  });
  protected readonly search = new FormControl<SpecificationCard | string>('', { nonNullable: true });
  protected readonly drafts = signal<readonly QuoteLineDraft[]>([]);
  /** What was refused and belongs to no field. */
  protected readonly problems = signal<Problems>([]);
  protected readonly saving = this.store.selectSignal(quotesFeature.selectSaving);
  protected readonly crumbs = [{ label: $localize`:@@quotes.new.crumb:Quotes`, path: '/quotes' }];

  protected readonly customers = toSignal(
    this.form.controls.customerId.valueChanges.pipe(
      startWith(''),
      debounceTime(PAUSE_MS),
      switchMap((typed) =>
        typeof typed === 'string'
          ? this.pickers
              .customers(typed)
              .pipe(catchError((error: unknown) => this.tell<readonly CustomerView[]>(error, [])))
          : EMPTY,
      ),
    ),
    { initialValue: [] },
  );
  protected readonly specifications = toSignal(
    this.search.valueChanges.pipe(
      debounceTime(PAUSE_MS),
      switchMap((typed) =>
        typeof typed === 'string' && typed.trim() !== ''
          ? this.pickers
              .specifications(typed.trim())
              .pipe(catchError((error: unknown) => this.tell<readonly SpecificationCard[]>(error, [])))
          : of([]),
      ),
    ),
    { initialValue: [] },
  );
  /** The prices in force without the quote, by line, for one case each. */
  private readonly prices = toSignal(
    combineLatest([
      toObservable(this.drafts),
      merge(
        this.form.controls.customerId.valueChanges,
        this.form.controls.pricesFrom.valueChanges,
        this.form.controls.lines.valueChanges,
      ).pipe(startWith(null)),
    ]).pipe(
      debounceTime(PAUSE_MS),
      switchMap(([drafts]) => this.pricesNow(drafts)),
    ),
    { initialValue: new Map<string, PricedLine>() },
  );
  protected readonly shownLines = computed(() =>
    this.drafts().map((draft) => ({ draft, today: this.prices().get(draft.id) ?? null })),
  );

  private idempotencyKey = newId();

  constructor() {
    this.form.patchValue(proposedDates(new Date()));
    this.store.dispatch(NewQuotePageActions.opened());
    // Something else is another deed: only the same quote is saved again under the same key.
    this.form.valueChanges.pipe(takeUntilDestroyed()).subscribe(() => (this.idempotencyKey = newId()));
    inject(Actions)
      .pipe(ofType(QuotesApiActions.saved), takeUntilDestroyed())
      .subscribe(({ quote }) => void this.router.navigate(['/quotes', quote.id]));
    effect(() => {
      const problem = this.saving().problem;
      if (problem) this.problems.set(this.placed(problem));
    });
  }

  protected readonly customerText = (picked: CustomerView | string): string =>
    typeof picked === 'string' ? picked : picked.name;
  protected readonly searchText = (picked: SpecificationCard | string): string =>
    typeof picked === 'string' ? picked : '';

  protected add(card: SpecificationCard): void {
    this.search.setValue('');
    this.pickers
      .specification(card.code)
      .pipe(catchError((error: unknown) => this.tell(error, null)))
      .subscribe((specification) => {
        if (!specification) return;
        const draft = draftOf(specification);
        this.drafts.update((drafts) => [...drafts, draft]);
        this.form.controls.lines.push(draft.form);
      });
  }

  protected takeOff(draft: QuoteLineDraft): void {
    this.form.controls.lines.removeAt(this.drafts().indexOf(draft));
    this.drafts.update((drafts) => drafts.filter((each) => each !== draft));
  }

  protected save(): void {
    this.problems.set([]);
    this.form.markAllAsTouched();
    const quote = this.written();
    if (this.form.invalid || quote === null) return;
    this.store.dispatch(NewQuotePageActions.savePressed({ quote, idempotencyKey: this.idempotencyKey }));
  }

  private written(): NewQuoteWire | null {
    const { customerId: customer, pricesFrom, pricesUntil, answerBy, notes } = this.form.getRawValue();
    const lines = this.drafts().flatMap((draft) => {
      const priceMinor = priceOf(draft);
      const { chosen, basis } = draft.form.getRawValue();
      const { specificationId } = draft.specification;
      return priceMinor === null ? [] : [{ specificationId, chosen, basis, priceMinor }];
    });
    if (typeof customer === 'string' || lines.length === 0) return null;
    return { customerId: customer.id, pricesFrom, pricesUntil, answerBy, notes, lines };
  }

  private pricesNow(drafts: readonly QuoteLineDraft[]) {
    const { customerId: customer, pricesFrom: deliveryDay } = this.form.getRawValue();
    const none = new Map<string, PricedLine>();
    if (typeof customer === 'string' || deliveryDay === '' || drafts.length === 0) return of(none);
    const lines = drafts.map(({ specification: { specificationId }, form }) => ({
      specificationId,
      chosen: form.controls.chosen.getRawValue(),
      quantity: { unit: 'case' as const, count: 1 },
    }));
    return this.priceChecks.check({ customerId: customer.id, deliveryDay, lines }).pipe(
      map(
        (answer) => new Map(answer.lines.flatMap((line, at) => (drafts[at] ? [[drafts[at].id, line] as const] : []))),
      ),
      // The price beside a line is a help: without it the quote can still be written.
      catchError(() => of(none)),
    );
  }

  /** Puts what the server refused at its fields; gives what has none. */
  private placed(problem: { readonly detail: string; readonly errors: Problems }): Problems {
    const homeless = showServerErrors(this.form, problem.errors);
    const atFields = problem.errors.length - homeless.length;
    return atFields > 0 || homeless.length > 0 ? homeless : [{ pointer: '', message: problem.detail }];
  }

  private tell<T>(error: unknown, instead: T) {
    this.problems.set([{ pointer: '', message: asProblem(error).detail }]);
    return of(instead);
  }
}

function isPicked({ value }: { readonly value: CustomerView | string }) {
  return typeof value === 'string'
    ? { message: $localize`:@@quotes.new.pickCustomer:Pick the customer from the list.` }
    : null;
}
