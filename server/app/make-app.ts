import express from 'express';
import type { Express } from 'express';
import { Problem } from '../errors/problem';
import { noSuchAddress, problemAnswers } from '../middleware/problems';
import { requestLog } from '../middleware/request-log';
import { noStore, securityHeaders } from '../middleware/security-headers';
import { cookieName, sessionMiddleware } from '../middleware/session';
import { ROUTES } from '../routes/route-table';
import type { Context } from '../integrations/context';
import { expressPath } from './path-parameters';
import { openApiDocument } from './open-api';
import { registerRoute } from './register-route';
import { serveClient } from './serve-client';

const BODY_LIMIT = '2mb';

/** An address that exists, with a method that it does not take. */
function refuseOtherMethods(app: Express): void {
  const paths = new Map<string, Set<string>>();
  for (const { path, method } of ROUTES) paths.set(path, (paths.get(path) ?? new Set()).add(method));
  for (const [path, methods] of paths) {
    app.all(expressPath(path), (_request, response) => {
      response.setHeader('Allow', [...methods].join(', '));
      throw new Problem('method-not-allowed');
    });
  }
}

/** The whole HTTP side, assembled from the route table. */
export function makeApp(context: Context): Express {
  const app = express();
  app.disable('x-powered-by');
  app.disable('etag');
  app.set('query parser', 'simple');
  // One proxy on this machine may say for whom it asks; nobody else.
  app.set('trust proxy', 'loopback');
  app.locals.openApi = openApiDocument(ROUTES, context.root, cookieName(context.config.secure));
  app.use(requestLog(context.log), securityHeaders(context.config.secure));
  const bare = ROUTES.filter((route) => route.kind === 'bare');
  const others = ROUTES.filter((route) => route.kind !== 'bare');
  app.use('/api', noStore);
  for (const route of bare) registerRoute(app, route, context);
  app.use(
    '/api',
    sessionMiddleware(context),
    express.json({ limit: BODY_LIMIT, strict: false, type: 'application/json' }),
  );
  for (const route of others) registerRoute(app, route, context);
  refuseOtherMethods(app);
  app.use('/api', noSuchAddress);
  serveClient(app, context.root);
  app.use(noSuchAddress);
  app.use(problemAnswers(context.log));
  return app;
}
