import { ChangeDetectionStrategy, Component, inject, input, output, signal } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatError, MatFormField, MatLabel } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import type { ClosureWire } from '@seamwright/ordering/contracts';
import { DeliveryCalendar } from '@seamwright/ordering/data-access';
import type { Problem } from '@seamwright/shared/contracts';
import { asProblem } from '@seamwright/shared/data-access';
import { Confirm, DatePipe, ErrorState } from '@seamwright/shared/ui';
import { FieldError } from '@seamwright/shared/ui/forms';

/** The days when the plant is closed; the administrator closes and opens days here. */
@Component({
  selector: 'sw-closures',
  imports: [
    DatePipe,
    ErrorState,
    FieldError,
    MatButton,
    MatError,
    MatFormField,
    MatInput,
    MatLabel,
    ReactiveFormsModule,
  ],
  templateUrl: './closures.html',
  styleUrl: './closures.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Closures {
  readonly closures = input.required<readonly ClosureWire[]>();
  readonly mayEdit = input.required<boolean>();
  readonly changed = output();

  private readonly calendar = inject(DeliveryCalendar);
  private readonly confirm = inject(Confirm);

  protected readonly running = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly form = new FormGroup({
    day: new FormControl('', { nonNullable: true, validators: Validators.required }),
    reason: new FormControl('', { nonNullable: true, validators: [Validators.required, Validators.maxLength(120)] }),
  });

  protected close(): void {
    this.form.markAllAsTouched();
    if (this.form.invalid) return;
    const { day, reason } = this.form.getRawValue();
    this.running.set(true);
    this.problem.set(null);
    this.calendar.close(day, reason).subscribe({
      next: () => {
        this.running.set(false);
        this.form.reset();
        this.changed.emit();
      },
      error: (error: unknown) => this.fail(error),
    });
  }

  protected async open({ day, reason }: ClosureWire): Promise<void> {
    const agreed = await this.confirm.ask({
      heading: $localize`:@@closures.open.heading:Open the plant again?`,
      text: $localize`:@@closures.open.text:${day}:day: (${reason}:reason:) can be ordered for again at once.`,
      act: $localize`:@@closures.open.act:Open the day`,
      back: $localize`:@@closures.open.back:Keep it closed`,
    });
    if (!agreed) return;
    this.problem.set(null);
    this.calendar.open(day).subscribe({
      next: () => this.changed.emit(),
      error: (error: unknown) => this.fail(error),
    });
  }

  private fail(error: unknown): void {
    this.running.set(false);
    this.problem.set(asProblem(error));
  }
}
