import type { RequestHandler } from 'express';
import helmet from 'helmet';

const SELF = "'self'";
const NONE = "'none'";
const ONE_YEAR_S = 31_536_000;

/** What the page may use of the device; the rest of the list is nobody's. */
const PERMISSIONS = 'camera=(self), screen-wake-lock=(self), geolocation=(), microphone=(), payment=(), usb=()';

/**
 * Headers that confine the page to its own origin. `secure`: browsers reach the server by HTTPS; without it HSTS and the upgrade of
 * requests would break a plain local network.
 */
export function securityHeaders({ secure }: { readonly secure: boolean }): readonly RequestHandler[] {
  const headers = helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: [SELF],
        scriptSrc: [SELF],
        scriptSrcAttr: [NONE],
        // component styles are written into the page by the framework
        styleSrc: [SELF, "'unsafe-inline'"],
        imgSrc: [SELF, 'data:'],
        fontSrc: [SELF],
        connectSrc: [SELF],
        workerSrc: [SELF],
        manifestSrc: [SELF],
        objectSrc: [NONE],
        baseUri: [SELF],
        formAction: [SELF],
        frameAncestors: [NONE],
        ...(secure ? { upgradeInsecureRequests: [] } : {}),
      },
    },
    xFrameOptions: { action: 'deny' },
    strictTransportSecurity: secure ? { maxAge: ONE_YEAR_S } : false,
  });
  const permissions: RequestHandler = (_req, res, next) => {
    res.set('Permissions-Policy', PERMISSIONS);
    next();
  };
  return [headers, permissions];
}
