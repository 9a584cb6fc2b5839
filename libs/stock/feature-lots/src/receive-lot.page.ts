import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import {
  FormControl,
  FormGroup,
  ReactiveFormsModule,
  Validators,
  type AbstractControl,
  type ValidationErrors,
} from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';
import { ActivatedRoute, Router } from '@angular/router';
import { catchError, map, of } from 'rxjs';
import { primalName } from '@seamwright/catalogue/domain';
import { LotReceipts, type LotReceipt } from '@seamwright/stock/data-access';
import { sayRefusal, type Problem } from '@seamwright/shared/contracts';
import { asProblem } from '@seamwright/shared/data-access';
import { Card, ErrorState, PageHead, Toast } from '@seamwright/shared/ui';
import { FieldError, FormErrors, showServerErrors } from '@seamwright/shared/ui/forms';
import { newId, parseKg, unwrap } from '@seamwright/shared/util';

/** The domain's own reading of a weight, as a validator. */
function readableKg({ value }: AbstractControl<string>): ValidationErrors | null {
  if (value.trim() === '') return null;
  const weight = parseKg(value);
  return weight.ok ? null : { message: sayRefusal(weight.refusal) };
}

const text = (...validators: ((control: AbstractControl<string>) => ValidationErrors | null)[]) =>
  new FormControl('', { nonNullable: true, validators: [Validators.required, ...validators] });
const country = () =>
  new FormControl('GB', { nonNullable: true, validators: [Validators.required, Validators.pattern(/^[A-Z]{2}$/)] });

/** Books a lot in from the supplier's papers. What was typed stays when something is refused. */
@Component({
  imports: [
    Card,
    ErrorState,
    FieldError,
    FormErrors,
    MatButton,
    MatFormFieldModule,
    MatInputModule,
    MatSelectModule,
    PageHead,
    ReactiveFormsModule,
  ],
  templateUrl: './receive-lot.page.html',
  styleUrl: './receive-lot.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReceiveLotPage {
  private readonly receipts = inject(LotReceipts);
  private readonly router = inject(Router);
  private readonly route = inject(ActivatedRoute);
  private readonly toast = inject(Toast);

  protected readonly crumbs = [{ label: $localize`:@@lots.heading:Lots`, path: '..' }];
  protected readonly primals = toSignal(
    this.receipts.primals().pipe(
      map(({ items }) => ({ items, problem: null as Problem | null })),
      catchError((error: unknown) => of({ items: [], problem: asProblem(error) })),
    ),
    { initialValue: { items: [], problem: null } },
  );
  protected readonly primalName = primalName;
  protected readonly sending = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly homeless = signal<Problem['errors']>([]);
  /** The same deed is sent again with the same key until something is changed. */
  private sent = { lot: '', key: '' };

  protected readonly form = new FormGroup({
    code: text(Validators.pattern(/^[A-Z0-9][A-Z0-9-]{1,19}$/)),
    nodeId: text(),
    supplier: text(Validators.maxLength(120)),
    killDate: text(),
    receivedOn: text(),
    useBy: new FormControl('', { nonNullable: true }),
    receivedPieces: new FormControl<number | null>(null, [
      Validators.required,
      Validators.min(1),
      Validators.max(100_000),
    ]),
    receivedGrams: text(readableKg),
    origin: new FormGroup({
      bornIn: country(),
      rearedIn: country(),
      slaughteredIn: country(),
      slaughterhouse: text(Validators.maxLength(40)),
    }),
  });

  protected send(): void {
    this.form.markAllAsTouched();
    if (this.form.invalid || this.sending()) return;
    const { receivedGrams, receivedPieces, useBy, ...rest } = this.form.getRawValue();
    const lot: LotReceipt = {
      ...rest,
      useBy: useBy === '' ? null : useBy,
      receivedPieces: receivedPieces ?? 0,
      receivedGrams: unwrap(parseKg(receivedGrams)),
    };
    const body = JSON.stringify(lot);
    if (this.sent.lot !== body) this.sent = { lot: body, key: newId() };
    this.sending.set(true);
    this.problem.set(null);
    this.receipts.receive(lot, this.sent.key).subscribe({
      next: ({ code, id }) => {
        void this.toast.show({ text: $localize`:@@lots.received.toast:Lot ${code}:lot: is booked in.` });
        void this.router.navigate(['..', id], { relativeTo: this.route });
      },
      error: (error: unknown) => {
        const problem = asProblem(error);
        this.sending.set(false);
        this.problem.set(problem);
        this.homeless.set([...showServerErrors(this.form, problem.errors)]);
      },
    });
  }
}
