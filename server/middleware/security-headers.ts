import type { RequestHandler } from 'express';
import helmet from 'helmet';

/**
 * Strict headers: scripts, styles and fonts come from this server's files only, and nothing is inline. `blob:` and
 * `data:` pictures are previews of what a person just picked. Requests are not upgraded to TLS here, so that plain
 * http on this machine and in a local network works; a proxy with TLS does that.
 */
export const securityHeaders = (): RequestHandler =>
  helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        workerSrc: ["'self'"],
        imgSrc: ["'self'", 'blob:', 'data:'],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
      },
    },
    referrerPolicy: { policy: 'same-origin' },
    frameguard: { action: 'deny' },
  });
