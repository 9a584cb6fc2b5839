import { ChangeDetectionStrategy, Component, computed, effect, inject, input, linkedSignal } from '@angular/core';
import { FormControl, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { Store } from '@ngrx/store';
import { LotPageActions, lotsFeature } from '@seamwright/stock/data-access';
import { lotStates } from '@seamwright/stock/domain';
import { Card, Chip, Confirm, DatePipe, ErrorState, KgPipe, Loading, PageHead, SeamLine } from '@seamwright/shared/ui';
import { FieldError } from '@seamwright/shared/ui/forms';
import { mayDecideLots } from './lot-deciders';
import { lotStages, lotStateName, lotTone } from './lot-words';
import { primalNames } from './primal-names';

/** One lot: where it comes from, what is left of it, and whether it may be cut. */
@Component({
  imports: [
    Card,
    Chip,
    DatePipe,
    ErrorState,
    FieldError,
    KgPipe,
    Loading,
    MatButton,
    MatFormFieldModule,
    MatInputModule,
    PageHead,
    ReactiveFormsModule,
    SeamLine,
  ],
  templateUrl: './lot.page.html',
  styleUrl: './lot.page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class LotPage {
  /** From the address. */
  readonly lotId = input.required<string>();

  private readonly store = inject(Store);
  private readonly confirm = inject(Confirm);

  protected readonly lot = this.store.selectSignal(lotsFeature.selectLot);
  protected readonly move = this.store.selectSignal(lotsFeature.selectMove);
  protected readonly crumbs = [{ label: $localize`:@@lots.heading:Lots`, path: '..' }];
  protected readonly primalName = primalNames();
  private readonly mayDecide = mayDecideLots();
  protected readonly stateName = lotStateName;
  protected readonly tone = lotTone;
  protected readonly stages = computed(() => {
    const lot = this.lot().data;
    return lot ? lotStages(lot) : [];
  });
  /** What the person may do with it as it stands. */
  protected readonly moves = computed(() => {
    const lot = this.lot().data;
    return lot && this.mayDecide() ? lotStates.allowedMoves(lot.state) : [];
  });
  /** Whether the reason for a hold is being asked; closes when the lot has moved. */
  protected readonly holding = linkedSignal({ source: () => this.lot().data?.rowVersion, computation: () => false });
  protected readonly reason = new FormControl('', {
    nonNullable: true,
    validators: [Validators.required, Validators.maxLength(300)],
  });

  constructor() {
    effect(() => this.store.dispatch(LotPageActions.opened({ lotId: this.lotId() })));
  }

  protected reload(): void {
    this.store.dispatch(LotPageActions.opened({ lotId: this.lotId() }));
  }

  protected hold(): void {
    const lot = this.lot().data;
    this.reason.markAsTouched();
    if (!lot || this.reason.invalid) return;
    const { id: lotId, rowVersion } = lot;
    this.store.dispatch(LotPageActions.holdPressed({ lotId, rowVersion, reason: this.reason.value }));
  }

  protected async release(): Promise<void> {
    const lot = this.lot().data;
    if (!lot) return;
    const sure = await this.confirm.ask({
      heading: $localize`:@@lots.ask.release:Release lot ${lot.code}:lot: for cutting?`,
      text: $localize`:@@lots.ask.releaseText:From now on it can be pulled, cut and packed.`,
      act: $localize`:@@lots.release:Release`,
      back: $localize`:@@lots.ask.back:Not yet`,
    });
    const { id: lotId, rowVersion } = lot;
    if (sure) this.store.dispatch(LotPageActions.releasePressed({ lotId, rowVersion }));
  }
}
