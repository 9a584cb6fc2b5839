import { ChangeDetectionStrategy, Component } from '@angular/core';

/** The product's mark: a stitched seam and its name. */
@Component({
  selector: 'sw-mark',
  template: `
    <svg width="26" height="26" viewBox="0 0 26 26" aria-hidden="true">
      <path d="M4 4C18 8 6 17 22 22" />
    </svg>
    <span>Seamwright</span>
  `,
  styles: `
    :host {
      display: flex;
      flex-wrap: wrap;
      gap: 0 10px;
      block-size: 28px;
      overflow: hidden;
      font-size: 20px;
      font-weight: 600;
      line-height: 28px;
      white-space: nowrap;
    }

    // Where there is no room for the name it falls below the edge, and the seam stands alone.
    svg {
      flex: none;
      margin-block: 1px;
    }

    path {
      fill: none;
      stroke: var(--sw-spruce);
      stroke-width: 3;
      stroke-linecap: round;
      stroke-dasharray: 5 4.6;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Mark {}
