import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { StaffSpecification } from '@seamwright/catalogue/contracts';
import { Card, DatePipe } from '@seamwright/shared/ui';
import { StageChip } from './stage-chip';

/** Every version of a specification with where it stands, newest first. */
@Component({
  selector: 'sw-record-versions',
  imports: [Card, DatePipe, MatButton, StageChip],
  template: `
    <sw-card heading="Versions" i18n-heading="@@catalogue.versions.heading">
      <p class="sw-small sw-muted" i18n="@@catalogue.versions.people">
        Version {{ specification().version }} written by {{ specification().authorName }}, approved by
        {{ specification().approverName ?? '–' }}
      </p>
      <ol reversed>
        @for (version of specification().versions; track version.version) {
          <li>
            <button
              matButton
              type="button"
              [attr.aria-current]="version.version === specification().version ? 'true' : null"
              (click)="show.emit(version.version)"
              i18n="@@catalogue.versions.number"
            >
              Version {{ version.version }}
            </button>
            <sw-stage-chip [version]="version" />
            @if (version.since; as since) {
              <span class="sw-small sw-muted" i18n="@@catalogue.versions.since"
                >since {{ since.slice(0, 10) | swDate }}</span
              >
            }
            @if (version.reason; as reason) {
              <span class="sw-small">{{ reason }}</span>
            }
          </li>
        }
      </ol>
    </sw-card>
  `,
  styles: `
    ol {
      padding: 0;
      list-style: none;
    }

    li {
      display: flex;
      flex-wrap: wrap;
      align-items: center;
      gap: 4px 12px;
    }

    [aria-current] {
      font-weight: 700;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RecordVersions {
  readonly specification = input.required<StaffSpecification>();
  readonly show = output<number>();
}
