import helmet from 'helmet';
import type { RequestHandler } from 'express';
import type { Config } from '@seamwright/shared/server';

const PROCESSOR = 'https://js.stripe.com';

/** No request leaves the origin; only with a publishable key may the card processor's own script and frames load. */
export function securityHeaders(config: Config): RequestHandler {
  const withCardForm = config.STRIPE_PUBLISHABLE_KEY ? [PROCESSOR] : [];
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'", ...withCardForm],
        // Angular writes component styles into the page.
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        connectSrc: ["'self'", ...(withCardForm.length ? ['https://api.stripe.com'] : [])],
        fontSrc: ["'self'"],
        frameSrc: withCardForm.length ? withCardForm : ["'none'"],
        objectSrc: ["'none'"],
        baseUri: ["'self'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
      },
    },
    strictTransportSecurity: config.PUBLIC_ORIGIN.startsWith('https:'),
    referrerPolicy: { policy: 'same-origin' },
    crossOriginEmbedderPolicy: false,
  });
}
