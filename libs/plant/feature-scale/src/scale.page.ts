import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  linkedSignal,
  LOCALE_ID,
  signal,
} from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { ActivatedRoute, Router } from '@angular/router';
import { Actions, ofType } from '@ngrx/effects';
import { Store } from '@ngrx/store';
import { PackingApiActions, packingFeature, ScalePageActions } from '@seamwright/plant/data-access';
import { Card, Confirm, Empty, ErrorState, KgPipe, Loading, PageHead, Toast } from '@seamwright/shared/ui';
import { formatPlantDate, isPlantDate, newId } from '@seamwright/shared/util';
import { LimitsBar } from './limits-bar';
import { LinePicker } from './line-picker';
import { NumberPad } from './number-pad';
import { PackList } from './pack-list';
import { PieceStepper } from './piece-stepper';
import { packReasons } from './reasons';
import { ShortPanel } from './short-panel';
import { TouchChoice } from './touch-choice';
import { nextLine, openOf, weighingOf } from './weighing';

/** Packs one order: choose the line, set the pieces, weigh, say why when it is out of limits, go on. */
@Component({
  imports: [
    Card,
    Empty,
    ErrorState,
    KgPipe,
    LimitsBar,
    LinePicker,
    Loading,
    MatButton,
    NumberPad,
    PackList,
    PageHead,
    PieceStepper,
    ShortPanel,
    TouchChoice,
  ],
  templateUrl: './scale.page.html',
  styleUrl: './scale.page.scss',
  host: { class: 'sw-floor sw-dark' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ScalePage {
  /** From the address. */
  readonly deliveryDay = input.required<string>();
  readonly orderId = input.required<string>();

  private readonly store = inject(Store);
  private readonly confirm = inject(Confirm);
  private readonly locale = inject(LOCALE_ID);

  protected readonly orders = this.store.selectSignal(packingFeature.selectOrders);
  protected readonly deed = this.store.selectSignal(packingFeature.selectDeed);
  private readonly dayState = this.store.selectSignal(packingFeature.selectDayState);

  protected readonly crumbs = [{ label: $localize`:@@scale.heading:Scale`, path: '../..' }];
  protected readonly reasons = packReasons().map((text) => ({ value: text, label: text }));

  protected readonly order = computed(() => this.orders().data?.find(({ id }) => id === this.orderId()) ?? null);
  private readonly wanted = signal<string | null>(null);
  protected readonly line = computed(() => {
    const lines = this.order()?.lines ?? [];
    return lines.find(({ id }) => id === this.wanted()) ?? nextLine(lines);
  });
  private readonly lineId = computed(() => this.line()?.id ?? null);
  protected readonly openPieces = computed(() => {
    const line = this.line();
    return line ? openOf(line) : 0;
  });
  /** Whether anything can be done: the day is on the floor and the order is not finished. */
  protected readonly open = computed(() => this.dayState() === 'released' && this.order()?.packedAt === null);
  protected readonly finishable = computed(() => (this.order()?.lines ?? []).every((line) => openOf(line) === 0));

  // What the packer set starts anew with each line, and stays when the order is fetched again meanwhile.
  protected readonly shorting = linkedSignal({ source: this.lineId, computation: () => false });
  protected readonly setting = linkedSignal<string | null, 'gross' | 'tare'>({
    source: this.lineId,
    computation: () => 'gross',
  });
  protected readonly gross = linkedSignal({ source: this.lineId, computation: () => 0 });
  private readonly usualTare = computed(() => this.line()?.tareGrams ?? 0);
  protected readonly tare = linkedSignal({
    source: () => ({ line: this.lineId(), tare: this.usualTare() }),
    computation: ({ tare }) => tare,
  });
  private readonly usualPieces = computed(() =>
    Math.max(1, Math.min(this.line()?.piecesPerPack ?? 1, this.openPieces())),
  );
  protected readonly pieces = linkedSignal({
    source: () => ({ line: this.lineId(), pieces: this.usualPieces() }),
    computation: ({ pieces }) => pieces,
  });
  private readonly firstLot = computed(() => this.line()?.lots[0]?.id ?? null);
  protected readonly lotId = linkedSignal({
    source: () => ({ line: this.lineId(), lot: this.firstLot() }),
    computation: ({ lot }) => lot,
  });
  protected readonly reason = linkedSignal<unknown, string | null>({
    source: () => ({ line: this.lineId(), pieces: this.pieces(), gross: this.gross(), tare: this.tare() }),
    computation: () => null,
  });

  protected readonly lots = computed(() =>
    (this.line()?.lots ?? []).map(({ id, code, useBy }) => ({
      value: id,
      label: code,
      note:
        useBy !== null && isPlantDate(useBy)
          ? $localize`:@@scale.useBy:use by ${formatPlantDate(useBy, 'short', this.locale)}:day:`
          : $localize`:@@scale.noUseBy:no use-by`,
    })),
  );
  protected readonly weighing = computed(() => {
    const line = this.line();
    if (!line) return null;
    return weighingOf({
      line,
      pieces: this.pieces(),
      grossGrams: this.gross(),
      tareGrams: this.tare(),
      reason: this.reason(),
    });
  });
  private readonly pack = computed(() => {
    const [orderLineId, lotId] = [this.lineId(), this.lotId()];
    if (orderLineId === null || lotId === null) return null;
    return {
      orderLineId,
      lotId,
      pieces: this.pieces(),
      grossGrams: this.gross(),
      tareGrams: this.tare(),
      reason: this.reason(),
    };
  });
  /** One key for one pack: pressing again after a lost answer sends the same deed, not a second pack. */
  private readonly key = linkedSignal({ source: this.pack, computation: () => newId() as string });
  protected readonly ready = computed(
    () => this.open() && this.openPieces() > 0 && this.pack() !== null && (this.weighing()?.ready ?? false),
  );

  constructor() {
    effect(() => this.store.dispatch(ScalePageActions.opened({ deliveryDay: this.deliveryDay() })));
    const toast = inject(Toast);
    const [router, route] = [inject(Router), inject(ActivatedRoute)];
    inject(Actions)
      .pipe(ofType(PackingApiActions.deedDone), takeUntilDestroyed())
      .subscribe(({ deed, order }) => {
        this.shorting.set(false);
        if (deed === 'pack') this.startAnew();
        if (deed === 'finish') {
          void toast.show({ text: $localize`:@@scale.finished:Order ${order.number}:number: is packed.` });
          void router.navigate(['../..'], { relativeTo: route });
        }
      });
  }

  protected choose(lineId: string): void {
    this.wanted.set(lineId);
  }

  protected setWeight(weight: number): void {
    (this.setting() === 'gross' ? this.gross : this.tare).set(weight);
  }

  protected weigh(): void {
    const [pack, orderId] = [this.pack(), this.orderId()];
    if (!pack || !this.ready() || this.deed().running) return;
    this.store.dispatch(ScalePageActions.packWeighed({ orderId, pack, idempotencyKey: this.key() }));
  }

  protected async takeBack(packId: string): Promise<void> {
    const sure = await this.confirm.ask({
      heading: $localize`:@@scale.ask.back:Take this pack back?`,
      text: $localize`:@@scale.ask.backText:Its weight is taken off the line and given back to the lot. Take its label off.`,
      act: $localize`:@@scale.takeBack:Take back`,
      back: $localize`:@@scale.ask.keep:Keep it`,
      destructive: true,
    });
    if (sure) this.store.dispatch(ScalePageActions.packTakenBack({ orderId: this.orderId(), packId }));
  }

  protected markShort({ pieces, reason }: { pieces: number; reason: string }): void {
    const [lineId, orderId] = [this.lineId(), this.orderId()];
    if (lineId === null) return;
    this.store.dispatch(ScalePageActions.shortMarked({ orderId, lineId, shortPieces: pieces, reason }));
  }

  protected finish(): void {
    this.store.dispatch(ScalePageActions.finishPressed({ orderId: this.orderId() }));
  }

  protected reload(): void {
    this.store.dispatch(ScalePageActions.opened({ deliveryDay: this.deliveryDay() }));
  }

  /** The next pack of the same line, or the next line when this one is done. */
  private startAnew(): void {
    this.gross.set(0);
    this.setting.set('gross');
    if (this.openPieces() === 0) this.wanted.set(null);
  }
}
