import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import express from 'express';
import type { Express } from 'express';
import { Problem } from '../errors/problem';
import { styleNonce } from '../middleware/security-headers';

const HOUR_SECONDS = 3600;
const YEAR_SECONDS = 31_536_000;

/** The built client: its files, and its page for every address that is not a file. */
export function serveClient(app: Express, root: string): void {
  const folder = join(root, 'dist/client');
  const page = join(folder, 'index.html');
  const html = existsSync(page) ? readFileSync(page, 'utf8') : null;
  app.use(
    express.static(folder, {
      index: false,
      redirect: false,
      setHeaders: (response, path) => {
        // Names under assets/ carry a hash of the content: what has that name never changes.
        const seconds = path.includes('/assets/') ? YEAR_SECONDS : HOUR_SECONDS;
        response.setHeader(
          'Cache-Control',
          `public, max-age=${seconds}${seconds === YEAR_SECONDS ? ', immutable' : ''}`,
        );
      },
    }),
  );
  app.get('/{*path}', (request, response) => {
    // A missing file is missing; only addresses of pages get the page.
    if (html === null || /\.\w+$/.test(request.path)) throw new Problem('not-found');
    response
      .setHeader('Cache-Control', 'no-store')
      .type('html')
      .send(html.replaceAll('__CSP_NONCE__', styleNonce(response)));
  });
}
