import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  output,
  signal,
  untracked,
} from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatCheckbox } from '@angular/material/checkbox';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';
import { sayRefusal } from '@seamwright/shared/contracts';
import { checkStanding, normaliseEmail, type DeskRole, type Person, type Reach } from '@seamwright/identity/domain';
import type { FieldProblem, ProblemText } from '@seamwright/shared/ui';
import { FieldError, FormErrors, showServerErrors } from '@seamwright/shared/ui/forms';
import { headProblems } from './head-problems';
import { roleNames } from './person-words';

export interface PersonFormValue {
  readonly email: string;
  readonly name: string;
  readonly roles: DeskRole[];
  readonly sites: '*' | string[];
  readonly customers: '*' | string[];
  readonly active: boolean;
}

/** Something to be chosen from by name: a site, a customer. */
interface Named {
  readonly id: string;
  readonly name: string;
}

/** Somebody to be invited, or the given person to be changed. What is typed stays until another person is given. */
@Component({
  selector: 'sw-person-form',
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
  templateUrl: './person-form.html',
  styleUrl: './form-grid.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PersonForm {
  readonly person = input<Person | null>(null);
  /** Whose people they are: the staff, or a customer's by its id. */
  readonly customerId = input.required<string | null>();
  /** The customer's sites, for a buyer who is kept to some. */
  readonly sites = input<readonly Named[]>([]);
  /** The customers, for a rep who is kept to some. */
  readonly customers = input<readonly Named[]>([]);
  readonly saving = input(false);
  readonly problem = input<ProblemText | null>(null);
  readonly save = output<PersonFormValue>();
  readonly leave = output();

  readonly #form = inject(NonNullableFormBuilder);
  protected readonly head = signal<readonly FieldProblem[]>([]);
  protected readonly roleNames = computed(() => roleNames(this.customerId() === null ? 'staff' : 'buyers'));
  protected readonly form = this.#form.group({
    email: ['', [Validators.required, Validators.email, Validators.maxLength(254)]],
    name: ['', [Validators.required, Validators.maxLength(120)]],
    roles: this.#form.control<DeskRole[]>([]),
    sites: this.#form.control<string[]>([]),
    customers: this.#form.control<string[]>([]),
    active: true,
  });
  readonly #value = toSignal(this.form.valueChanges, { initialValue: this.form.getRawValue() });
  readonly #roles = computed(() => this.#value().roles ?? []);
  protected readonly maySites = computed(
    () => this.customerId() !== null && this.sites().length > 0 && !this.#roles().includes('buyer_owner'),
  );
  protected readonly mayCustomers = computed(
    () => this.customerId() === null && this.#roles().length > 0 && this.#roles().every((role) => role === 'rep'),
  );
  /** What is wrong with the standing as chosen, said once the form was sent. */
  protected readonly wrong = signal('');

  constructor() {
    effect(() => {
      const person = this.person();
      const customerId = this.customerId();
      untracked(() => this.#begin(person, customerId));
    });
    effect(() => {
      const problem = this.problem();
      this.head.set(problem ? headProblems(problem, showServerErrors(this.form, problem.errors ?? [])) : []);
    });
  }

  #begin(person: Person | null, customerId: string | null): void {
    const fresh = { roles: customerId === null ? [] : (['buyer'] as DeskRole[]) };
    this.form.reset(person ? chosenBy(person) : fresh);
    if (person) this.form.controls.email.disable();
  }

  protected has(role: DeskRole): boolean {
    return this.#roles().includes(role);
  }

  protected give(role: DeskRole, given: boolean): void {
    const control = this.form.controls.roles;
    // A customer's people have one role, staff as many as they do work.
    const others = this.customerId() === null ? control.value.filter((each) => each !== role) : [];
    control.setValue(given ? [...others, role] : others);
    this.wrong.set('');
  }

  protected submit(): void {
    this.form.markAllAsTouched();
    if (this.form.invalid || this.saving()) return;
    const { email, name, roles, sites, customers, active } = this.form.getRawValue();
    const standing = {
      roles,
      sites: this.maySites() && sites.length > 0 ? sites : ('*' as const),
      customers: this.mayCustomers() && customers.length > 0 ? customers : ('*' as const),
    };
    const checked = checkStanding({ ...standing, customerId: this.customerId() });
    this.wrong.set(checked.ok ? '' : sayRefusal(checked.refusal));
    if (checked.ok) this.save.emit({ email: normaliseEmail(email), name: name.trim(), ...standing, active });
  }
}

const ids = (reach: Reach): string[] => (reach === '*' ? [] : [...reach]);

const chosenBy = ({ email, name, roles, sites, customers, state }: Person) => ({
  email,
  name,
  roles: [...roles],
  sites: ids(sites),
  customers: ids(customers),
  active: state !== 'inactive',
});
