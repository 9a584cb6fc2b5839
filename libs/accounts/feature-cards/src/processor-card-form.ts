import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  DestroyRef,
  ElementRef,
  inject,
  input,
  output,
  signal,
  viewChild,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Stripe, StripeElements } from '@stripe/stripe-js';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { Loading } from '@seamwright/shared/ui';
import { CARD_FORM_LOADER } from './card-form-loader';

/** The card processor's own form in its own frame: the number never comes here. */
@Component({
  selector: 'sw-processor-card-form',
  imports: [Loading, MatButton],
  template: `
    <p class="sw-muted" i18n="@@cards.form.note">
      The fields below belong to the card processor. The number goes straight there.
    </p>
    @if (!ready() && fault() === '') {
      <sw-loading [count]="3" />
    }
    <div #place></div>
    @if (fault(); as words) {
      <p class="sw-note bad" role="alert">{{ words }}</p>
    }
    <div class="sw-acts">
      <button
        matButton="filled"
        type="button"
        [disabled]="!ready() || busy() || sending()"
        (click)="send()"
        i18n="@@cards.form.keep"
      >
        Keep this card
      </button>
      <button matButton type="button" (click)="left.emit()" i18n="@@cards.form.leave">Leave it</button>
    </div>
  `,
  styles: `
    :host {
      display: grid;
      gap: 16px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ProcessorCardForm {
  readonly publishableKey = input.required<string>();
  readonly busy = input(false);
  /** The id of the method that the processor made of what was entered. */
  readonly entered = output<string>();
  readonly left = output();

  protected readonly ready = signal(false);
  protected readonly sending = signal(false);
  protected readonly fault = signal('');

  private readonly load = inject(CARD_FORM_LOADER);
  private readonly place = viewChild.required<ElementRef<HTMLElement>>('place');
  private processor: Stripe | null = null;
  private elements: StripeElements | null = null;
  private gone = false;

  constructor() {
    afterNextRender(() => void this.open());
    inject(DestroyRef).onDestroy(() => {
      this.gone = true;
      this.elements?.getElement('payment')?.destroy();
    });
  }

  protected async send(): Promise<void> {
    const { processor, elements } = this;
    if (!processor || !elements) return;
    this.sending.set(true);
    this.fault.set('');
    // What is missing in a field, the form says beside it.
    const { error: unfinished } = await elements.submit();
    if (!unfinished) {
      const { error, paymentMethod } = await processor.createPaymentMethod({ elements });
      if (paymentMethod) this.entered.emit(paymentMethod.id);
      else this.fault.set(error?.message ?? unreachable);
    }
    this.sending.set(false);
  }

  private async open(): Promise<void> {
    const processor = await this.load(this.publishableKey()).catch(() => null);
    if (this.gone) return;
    if (!processor) {
      this.fault.set(unreachable);
      return;
    }
    this.processor = processor;
    this.elements = processor.elements({
      mode: 'setup',
      currency: HOUSE_CURRENCY.toLowerCase(),
      paymentMethodCreation: 'manual',
    });
    const form = this.elements.create('payment');
    form.on('ready', () => this.ready.set(true));
    form.on('loaderror', () => this.fault.set(unreachable));
    form.mount(this.place().nativeElement);
  }
}

const unreachable = $localize`:@@cards.form.unreachable:The form of the card processor could not be loaded. Look at the connection, then open this again.`;
