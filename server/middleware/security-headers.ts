import { randomBytes } from 'node:crypto';
import type { Request, RequestHandler, Response } from 'express';
import helmet from 'helmet';

const nonces = new WeakMap<object, string>();

/** The nonce of this answer's style elements; nobody can foresee it. */
export function styleNonce(response: object): string {
  const known = nonces.get(response);
  if (known) return known;
  const fresh = randomBytes(18).toString('base64url');
  nonces.set(response, fresh);
  return fresh;
}

const none = ["'none'"];
const self = ["'self'"];

/** Our own strict policy: no `unsafe-*`, nothing from elsewhere, no framing. */
export function securityHeaders(secure: boolean): RequestHandler {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: self,
        scriptSrc: self,
        styleSrc: ["'self'", (_request, response) => `'nonce-${styleNonce(response)}'`],
        imgSrc: ["'self'", 'data:', 'blob:'],
        fontSrc: self,
        connectSrc: self,
        workerSrc: self,
        objectSrc: none,
        baseUri: none,
        frameAncestors: none,
        formAction: self,
      },
    },
    strictTransportSecurity: secure ? { maxAge: 31_536_000, includeSubDomains: true } : false,
    xFrameOptions: { action: 'deny' },
    referrerPolicy: { policy: 'same-origin' },
    crossOriginEmbedderPolicy: false,
  });
}

/** API answers are nobody's to keep. */
export const noStore: RequestHandler = (_request: Request, response: Response, next) => {
  response.setHeader('Cache-Control', 'no-store');
  next();
};
