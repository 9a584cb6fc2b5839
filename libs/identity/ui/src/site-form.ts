import { ChangeDetectionStrategy, Component, effect, inject, input, output, signal, untracked } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatCheckbox } from '@angular/material/checkbox';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import type { Site } from '@seamwright/identity/domain';
import type { FieldProblem, ProblemText } from '@seamwright/shared/ui';
import { FieldError, FormErrors, showServerErrors } from '@seamwright/shared/ui/forms';
import { headProblems } from './head-problems';
import { filled } from './filled';

export interface SiteFormValue {
  readonly name: string;
  readonly address: string;
  readonly postcode: string;
  readonly contactName: string | null;
  readonly phone: string | null;
  readonly accessNotes: string | null;
  readonly active: boolean;
}

/** A place to deliver to: new, or the given one to be changed. What is typed stays until another site is given. */
@Component({
  selector: 'sw-site-form',
  imports: [FieldError, FormErrors, MatButton, MatCheckbox, MatFormFieldModule, MatInput, ReactiveFormsModule],
  templateUrl: './site-form.html',
  styleUrl: './form-grid.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SiteForm {
  readonly site = input<Site | null>(null);
  readonly saving = input(false);
  readonly problem = input<ProblemText | null>(null);
  readonly save = output<SiteFormValue>();
  readonly leave = output();

  readonly #form = inject(NonNullableFormBuilder);
  protected readonly head = signal<readonly FieldProblem[]>([]);
  protected readonly form = this.#form.group({
    name: ['', [Validators.required, Validators.maxLength(120)]],
    address: ['', [Validators.required, Validators.maxLength(500)]],
    postcode: ['', [Validators.required, Validators.maxLength(12)]],
    contactName: ['', Validators.maxLength(120)],
    phone: ['', Validators.maxLength(30)],
    accessNotes: ['', Validators.maxLength(1000)],
    active: true,
  });

  constructor() {
    effect(() => {
      const site = this.site();
      untracked(() => (site ? this.form.reset(textsOf(site)) : this.form.reset()));
    });
    effect(() => {
      const problem = this.problem();
      this.head.set(problem ? headProblems(problem, showServerErrors(this.form, problem.errors ?? [])) : []);
    });
  }

  protected submit(): void {
    this.form.markAllAsTouched();
    if (this.form.invalid || this.saving()) return;
    const { name, address, postcode, contactName, phone, accessNotes, active } = this.form.getRawValue();
    this.save.emit({
      name: name.trim(),
      address: address.trim(),
      postcode: postcode.trim(),
      contactName: filled(contactName),
      phone: filled(phone),
      accessNotes: filled(accessNotes),
      active,
    });
  }
}

const textsOf = ({ name, address, postcode, contactName, phone, accessNotes, active }: Site) => ({
  name,
  address,
  postcode,
  contactName: contactName ?? '',
  phone: phone ?? '',
  accessNotes: accessNotes ?? '',
  active,
});
