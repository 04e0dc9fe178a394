import { createServer } from 'node:http';
import type { RequestListener, Server } from 'node:http';

/** Answers while the database is not there yet: the process lives, nothing else works. */
export const notYet: RequestListener = (request, response) => {
  const live = request.url === '/api/health/live';
  const body = live
    ? { status: 'live' }
    : { type: '/problems/unavailable', title: 'Not available for the moment', status: 503 };
  response.writeHead(live ? 200 : 503, {
    'Content-Type': live ? 'application/json' : 'application/problem+json',
    'Cache-Control': 'no-store',
    ...(live ? {} : { 'Retry-After': '2' }),
  });
  response.end(JSON.stringify(body));
};

/** A server that drops slow clients within seconds instead of keeping their sockets for minutes. */
export function makeHttpServer(listener: RequestListener): Server {
  const server = createServer(
    {
      connectionsCheckingInterval: 2000,
      headersTimeout: 10_000,
      requestTimeout: 30_000,
      keepAliveTimeout: 5000,
    },
    listener,
  );
  server.maxConnections = 2000;
  return server;
}

export function listen(server: Server, port: number): Promise<void> {
  return new Promise((done, fail) => {
    server.once('error', fail);
    server.listen(port, '127.0.0.1', () => {
      server.off('error', fail);
      done();
    });
  });
}

/** Ends politely: what is being answered is answered, idle connections go at once. */
export function closeServer(server: Server, patienceMs = 5000): Promise<void> {
  return new Promise((done) => {
    const timer = setTimeout(() => server.closeAllConnections(), patienceMs);
    server.close(() => {
      clearTimeout(timer);
      done();
    });
    server.closeIdleConnections();
  });
}
