import { ChangeDetectionStrategy, Component, effect, inject, input, output, signal, untracked } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatCheckbox } from '@angular/material/checkbox';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';
import type { Problem } from '@seamwright/shared/contracts';
import type { CustomerFacts, CustomerView, GroupView } from '@seamwright/identity/contracts';
import { normaliseEmail, type CustomerKind, type TermsFrom } from '@seamwright/identity/domain';
import { customerKindNames, termsFromNames } from '@seamwright/identity/ui';
import type { FieldProblem } from '@seamwright/shared/ui';
import { FieldError, FormErrors, showServerErrors } from '@seamwright/shared/ui/forms';

export type CustomerFormValue = CustomerFacts & { readonly active: boolean };

/** A customer's facts: new, or the given one's to be changed. What is typed stays until another customer is given. */
@Component({
  selector: 'sw-customer-form',
  imports: [
    FieldError,
    FormErrors,
    MatButton,
    MatCheckbox,
    MatFormFieldModule,
    MatInput,
    MatSelectModule,
    ReactiveFormsModule,
  ],
  templateUrl: './customer-form.html',
  styleUrl: './customer-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CustomerForm {
  readonly customer = input<CustomerView | null>(null);
  readonly groups = input<readonly GroupView[]>([]);
  readonly saving = input(false);
  readonly problem = input<Problem | null>(null);
  readonly save = output<CustomerFormValue>();

  protected readonly kinds = customerKindNames;
  protected readonly terms = termsFromNames;
  protected readonly head = signal<readonly FieldProblem[]>([]);
  protected readonly form = inject(NonNullableFormBuilder).group({
    name: ['', [Validators.required, Validators.maxLength(120)]],
    kind: ['restaurant' as CustomerKind, Validators.required],
    groupId: '',
    invoiceEmail: ['', [Validators.required, Validators.email, Validators.maxLength(254)]],
    billingAddress: ['', [Validators.required, Validators.maxLength(500)]],
    vatNumber: ['', Validators.maxLength(20)],
    termsDays: [14, [Validators.required, Validators.min(0), Validators.max(120), Validators.pattern(/^\d+$/)]],
    termsFrom: ['invoice' as TermsFrom, Validators.required],
    active: true,
  });

  constructor() {
    effect(() => {
      const customer = this.customer();
      untracked(() => (customer ? this.form.reset(typedOf(customer)) : this.form.reset()));
    });
    effect(() => {
      const problem = this.problem();
      const homeless = problem ? showServerErrors(this.form, problem.errors) : [];
      const whole = problem && problem.errors.length === 0 ? [{ pointer: '', message: problem.detail }] : [];
      this.head.set([...whole, ...homeless]);
    });
  }

  protected submit(): void {
    this.form.markAllAsTouched();
    if (this.form.invalid || this.saving()) return;
    const { name, groupId, invoiceEmail, billingAddress, vatNumber, ...rest } = this.form.getRawValue();
    this.save.emit({
      ...rest,
      name: name.trim(),
      groupId: groupId || null,
      invoiceEmail: normaliseEmail(invoiceEmail),
      billingAddress: billingAddress.trim(),
      vatNumber: vatNumber.trim() || null,
    });
  }
}

const typedOf = ({ groupId, vatNumber, ...customer }: CustomerView) => ({
  name: customer.name,
  kind: customer.kind,
  groupId: groupId ?? '',
  invoiceEmail: customer.invoiceEmail,
  billingAddress: customer.billingAddress,
  vatNumber: vatNumber ?? '',
  termsDays: customer.termsDays,
  termsFrom: customer.termsFrom,
  active: customer.active,
});
