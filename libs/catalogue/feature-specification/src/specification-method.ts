import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import type { MethodStep } from '@seamwright/catalogue/domain';
import { Icon } from '@seamwright/shared/ui';

/** How it is cut, step by step, each with its caution. */
@Component({
  selector: 'sw-specification-method',
  imports: [Icon],
  template: `
    <h2 i18n="@@catalogue.method.heading">How it is cut</h2>
    <ol>
      @for (step of steps(); track $index) {
        <li>
          <p>{{ step.text }}</p>
          @if (step.caution) {
            <p class="caution">
              <sw-icon name="warning" [size]="18" /><span>{{ step.caution }}</span>
            </p>
          }
        </li>
      }
    </ol>
    <p class="sw-note" i18n="@@catalogue.method.guidance">
      General guidance. Local codes and the competent authority govern; trained and licensed people decide.
    </p>
  `,
  styleUrl: './specification-method.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SpecificationMethod {
  readonly steps = input.required<readonly MethodStep[]>();
}
