import { ChangeDetectionStrategy, Component, computed, DestroyRef, effect, inject, input, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { Router } from '@angular/router';
import { Store } from '@ngrx/store';
import { withdrawSpecification, type StaffSpecification } from '@seamwright/catalogue/contracts';
import { offeredNumbers, TechnicalApi } from '@seamwright/catalogue/data-access';
import { drawnNumbers, impliedDifferencePercent, impliedGrams, resolveOffer } from '@seamwright/catalogue/domain';
import { SpecDrawing, weightText } from '@seamwright/catalogue/ui';
import { selectRoles } from '@seamwright/identity/data-access/session';
import { asProblem, failed, idle, loaded, loading, type Remote } from '@seamwright/shared/data-access';
import { Card, Confirm, ErrorState, Loading, PageHead, Toast } from '@seamwright/shared/ui';
import { UNIT_SPACE } from '@seamwright/shared/util';
import { RecordNumbers } from './record-numbers';
import { RecordOutputs } from './record-outputs';
import { RecordVersions } from './record-versions';
import { StageChip } from './stage-chip';
import { WithdrawForm } from './withdraw-form';

/** All that one version says, read only, with its yields, work and place among its versions. */
@Component({
  imports: [
    Card,
    ErrorState,
    Loading,
    PageHead,
    RecordNumbers,
    RecordOutputs,
    RecordVersions,
    SpecDrawing,
    StageChip,
    WithdrawForm,
  ],
  templateUrl: './specification-record.page.html',
  styleUrl: './specification-record.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SpecificationRecordPage {
  // From the address; without a version, the one in force.
  readonly code = input.required<string>();
  readonly version = input<string>();

  readonly #api = inject(TechnicalApi);
  readonly #confirm = inject(Confirm);
  readonly #toast = inject(Toast);
  readonly #router = inject(Router);
  readonly #destroyed = inject(DestroyRef);
  readonly #roles = inject(Store).selectSignal(selectRoles);

  protected readonly record = signal<Remote<StaffSpecification>>(idle());
  protected readonly sending = signal(false);
  protected readonly mayWithdraw = computed(() => {
    const { access } = withdrawSpecification;
    return access.who === 'roles' && access.roles.some((role) => this.#roles().includes(role));
  });
  protected readonly crumbs = [
    { label: $localize`:@@catalogue.technical.title:Specifications`, path: '/specifications' },
  ];

  protected readonly numbers = computed(() => {
    const specification = this.record().data;
    const resolved = specification && resolveOffer(offeredNumbers(specification), {});
    return resolved?.ok ? drawnNumbers(resolved.value) : null;
  });
  /** What the dimensions would weigh, beside what is stated. */
  protected readonly implied = computed(() => {
    const numbers = this.numbers();
    const grams = numbers && impliedGrams(numbers);
    if (numbers === null || grams === null) return null;
    const off = impliedDifferencePercent(numbers) ?? 0;
    return { weight: weightText(grams), off: `${off > 0 ? '+' : off < 0 ? '−' : '±'}${Math.abs(off)}${UNIT_SPACE}%` };
  });

  constructor() {
    effect((onCleanup) => {
      const version = Number(this.version());
      this.record.set(loading(idle()));
      const reading = this.#api.record(this.code(), version > 0 ? version : undefined).subscribe({
        next: (record) => this.record.set(loaded(record)),
        error: (error: unknown) => this.record.update((before) => failed(before, asProblem(error))),
      });
      onCleanup(() => reading.unsubscribe());
    });
  }

  protected show(version: number): void {
    void this.#router.navigate([], { queryParams: { version } });
  }

  protected async withdraw(reason: string): Promise<void> {
    const record = this.record().data;
    if (record === null || this.sending()) return;
    const sure = await this.#confirm.ask({
      heading: $localize`:@@catalogue.withdraw.heading:Withdraw ${record.code}:code: ${record.name}:name:?`,
      text: $localize`:@@catalogue.withdraw.text:It can be neither found nor ordered from now on. Orders already placed keep this version.`,
      act: $localize`:@@catalogue.withdraw.act:Withdraw`,
      back: $localize`:@@catalogue.withdraw.back:Keep it`,
      destructive: true,
    });
    if (!sure) return;
    this.sending.set(true);
    this.#api
      .withdraw(record, reason)
      .pipe(takeUntilDestroyed(this.#destroyed))
      .subscribe({
        next: (withdrawn) => {
          this.sending.set(false);
          this.record.set(loaded(withdrawn));
          void this.#toast.show({ text: $localize`:@@catalogue.withdraw.done:${withdrawn.code}:code: is withdrawn.` });
        },
        error: (error: unknown) => {
          this.sending.set(false);
          this.record.update((before) => failed(before, asProblem(error)));
        },
      });
  }
}
