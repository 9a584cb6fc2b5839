import {
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  ElementRef,
  inject,
  input,
  LOCALE_ID,
  signal,
} from '@angular/core';
import { MoneyPipe } from '@seamwright/shared/ui';
import { formatMoney, minorUnits, type CurrencyCode } from '@seamwright/shared/util';
import { flowWord } from './flow-words';
import { comesIn, fromPaidOut, goesOut, type FlowKey, type MoneyFlow } from './money-flow';
import { ACROSS_FROM, moneySeam } from './money-seam.geometry';

/**
 * A week of card money as one flow from the cards to the bank: widths are amounts, and the seam is broken where money
 * is unexplained. Drawn for the width that there is, so that its words keep their size.
 */
@Component({
  selector: 'sw-money-seam',
  imports: [MoneyPipe],
  templateUrl: './money-seam.html',
  styleUrl: './money-seam.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MoneySeam {
  readonly flow = input.required<MoneyFlow>();
  readonly currency = input.required<CurrencyCode>();

  private readonly locale = inject(LOCALE_ID);
  private readonly width = signal(ACROSS_FROM);

  protected readonly seam = computed(() => moneySeam(this.flow(), this.width()));
  protected readonly word = (key: FlowKey): string => flowWord(key);
  /** The whole picture in one sentence. */
  protected readonly told = computed(() => {
    const flow = this.flow();
    const list = (parts: readonly { key: FlowKey; minor: number }[]) =>
      parts
        .map(({ key, minor }) => `${flowWord(key)} ${formatMoney(minorUnits(minor), this.currency(), this.locale)}`)
        .join(', ');
    const [came, went, then] = [
      list(comesIn(flow)),
      list(goesOut(flow)),
      list([...fromPaidOut(flow), ...(flow.bankMoreMinor > 0 ? [more(flow)] : [])]),
    ];
    return $localize`:@@moneySeam.told:To the processor came: ${came}:came:. Of it went: ${went}:went:. Of what was paid out: ${then}:then:.`;
  });

  constructor() {
    const host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
    if (typeof ResizeObserver === 'undefined') return;
    const observer = new ResizeObserver(([entry]) => {
      const width = Math.floor(entry?.contentRect.width ?? 0);
      if (width > 0) this.width.set(width);
    });
    observer.observe(host);
    inject(DestroyRef).onDestroy(() => observer.disconnect());
  }
}

const more = ({ bankMoreMinor }: MoneyFlow) => ({ key: 'bank-more' as const, minor: bankMoreMinor });
