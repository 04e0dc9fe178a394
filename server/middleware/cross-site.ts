import { timingSafeEqual } from 'node:crypto';
import type { Request } from 'express';
import { Problem } from '../errors/problem';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/** Refuses a write that another site's page made the browser send. */
export function refuseCrossSite(request: Request, publicUrl: URL): void {
  if (SAFE.has(request.method)) return;
  const site = request.get('sec-fetch-site');
  if (site !== undefined) {
    if (site !== 'same-origin' && site !== 'none') throw new Problem('cross-site');
    return;
  }
  // Older browsers and tools: an Origin, where there is one, must be ours.
  const origin = request.get('origin');
  const own = [publicUrl.origin, `${request.protocol}://${request.get('host') ?? ''}`];
  if (origin !== undefined && !own.includes(origin)) throw new Problem('cross-site');
}

/** Refuses a write of somebody signed in that does not carry the session's own token. */
export function requireToken(request: Request, csrfToken: string): void {
  if (SAFE.has(request.method)) return;
  const given = Buffer.from(request.get('x-csrf-token') ?? '');
  const wanted = Buffer.from(csrfToken);
  if (given.length !== wanted.length || !timingSafeEqual(given, wanted)) {
    throw new Problem('cross-site', {
      detail: 'The header X-CSRF-Token is missing or belongs to another session.',
    });
  }
}
