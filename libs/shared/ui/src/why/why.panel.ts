import { A11yModule } from '@angular/cdk/a11y';
import {
  createBlockScrollStrategy,
  createFlexibleConnectedPositionStrategy,
  createGlobalPositionStrategy,
  createOverlayRef,
  createRepositionScrollStrategy,
  type OverlayConfig,
} from '@angular/cdk/overlay';
import { ComponentPortal } from '@angular/cdk/portal';
import {
  ChangeDetectionStrategy,
  Component,
  type ElementRef,
  inject,
  InjectionToken,
  Injector,
  type Signal,
} from '@angular/core';
import { Icon } from '../icons/icon';
import type { WhyAnswer } from './why-answer';

/** An open panel. */
export interface WhyPanelRef {
  close(): void;
}

const ANSWER = new InjectionToken<Signal<WhyAnswer>>('what the panel shows');
const CLOSE = new InjectionToken<() => void>('closes the panel');

let made = 0;

/** The parts of a number, one below the other. */
@Component({
  selector: 'sw-why-panel',
  imports: [A11yModule, Icon],
  templateUrl: './why.panel.html',
  styleUrl: './why.panel.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class WhyPanel {
  protected readonly answer = inject(ANSWER);
  protected readonly close = inject(CLOSE);
  protected readonly headingId = `sw-why-${++made}`;
}

/** Opens the panel at the element that asked; Escape and a press outside close it. `closed` is called once. */
export function openWhyPanel(
  injector: Injector,
  asked: ElementRef<HTMLElement>,
  answer: Signal<WhyAnswer>,
  closed: () => void,
): WhyPanelRef {
  const overlay = createOverlayRef(injector, window.innerWidth < 600 ? fromTheFoot(injector) : beside(injector, asked));
  const close = (): void => {
    if (overlay.hasAttached()) {
      overlay.dispose();
      closed();
    }
  };
  overlay.backdropClick().subscribe(close);
  overlay.keydownEvents().subscribe((event) => {
    if (event.key === 'Escape') {
      event.preventDefault();
      close();
    }
  });
  const own = Injector.create({
    parent: injector,
    providers: [
      { provide: ANSWER, useValue: answer },
      { provide: CLOSE, useValue: close },
    ],
  });
  overlay.attach(new ComponentPortal(WhyPanel, null, own));
  return { close };
}

function fromTheFoot(injector: Injector): OverlayConfig {
  return {
    positionStrategy: createGlobalPositionStrategy(injector).bottom('0').centerHorizontally(),
    scrollStrategy: createBlockScrollStrategy(injector),
    hasBackdrop: true,
    width: '100%',
  };
}

function beside(injector: Injector, asked: ElementRef<HTMLElement>): OverlayConfig {
  return {
    positionStrategy: createFlexibleConnectedPositionStrategy(injector, asked)
      .withPush()
      .withViewportMargin(16)
      .withPositions([
        { originX: 'start', originY: 'bottom', overlayX: 'start', overlayY: 'top', offsetY: 4 },
        { originX: 'end', originY: 'bottom', overlayX: 'end', overlayY: 'top', offsetY: 4 },
        { originX: 'start', originY: 'top', overlayX: 'start', overlayY: 'bottom', offsetY: -4 },
        { originX: 'end', originY: 'top', overlayX: 'end', overlayY: 'bottom', offsetY: -4 },
      ]),
    scrollStrategy: createRepositionScrollStrategy(injector),
    hasBackdrop: true,
    backdropClass: 'cdk-overlay-transparent-backdrop',
  };
}
