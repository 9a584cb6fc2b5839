import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

/** The outline of what is on its way: so many lines, or boxes for cards. Screen readers hear one sentence. */
@Component({
  selector: 'sw-loading',
  template: `
    <span class="cdk-visually-hidden">{{ label() }}</span>
    @for (width of lines(); track $index) {
      <span class="line" [style.inline-size.%]="width"></span>
    }
  `,
  styleUrl: './loading.scss',
  host: { role: 'status', 'aria-busy': 'true', '[attr.data-shape]': 'shape()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Loading {
  readonly label = input($localize`:@@ui.loading.label:Loading`);
  readonly shape = input<'lines' | 'boxes'>('lines');
  readonly count = input(4);

  /** Widths in per cent: uneven, as text is; boxes fill their place. */
  protected readonly lines = computed(() =>
    Array.from({ length: this.count() }, (_, index) => (this.shape() === 'boxes' ? 100 : 96 - ((index * 23) % 38))),
  );
}
