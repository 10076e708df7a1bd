import type { RequestHandler } from 'express';
import helmet from 'helmet';
import type { Configuration } from '../config';

/**
 * Headers that keep a page to itself: scripts, fonts and connections of this server only, no
 * frames around it, no plug-ins, no inline script and no `eval`. Inline styles are allowed because
 * the components' styles are written into the page while it runs.
 */
export function securityHeaders(config: Configuration): RequestHandler {
  const encrypted = config.publicUrl.startsWith('https:');
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        scriptSrcAttr: ["'none'"],
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        objectSrc: ["'none'"],
        baseUri: ["'self'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        ...(encrypted ? { upgradeInsecureRequests: [] } : {}),
      },
    },
    strictTransportSecurity: encrypted,
    referrerPolicy: { policy: 'no-referrer' },
    xFrameOptions: { action: 'deny' },
  });
}
