import connectPgSimple from 'connect-pg-simple';
import type { RequestHandler } from 'express';
import session from 'express-session';
import type { Context } from '../integrations/context';
import { passport } from './passport';

declare module 'express-session' {
  interface SessionData {
    passport?: { user?: string };
  }
}
declare global {
  // eslint-disable-next-line @typescript-eslint/no-namespace
  namespace Express {
    interface User {
      id: string;
    }
  }
}

const APPLICANT_IDLE_MS = 30 * 60_000;

/** The cookie's name: the prefixed one is only taken by browsers over https. */
export const cookieName = (secure: boolean) => (secure ? '__Host-cp' : 'cp');

/** Sessions in PostgreSQL, and passport over them. A store that is down is an error, never an anonymous visitor. */
export function sessionMiddleware({ config, pool }: Context): RequestHandler[] {
  const Store = connectPgSimple(session);
  const store = new Store({ pool, tableName: 'sessions', pruneSessionInterval: false });
  return [
    session({
      store,
      name: cookieName(config.secure),
      secret: config.sessionSecret,
      resave: false,
      saveUninitialized: false,
      rolling: true,
      cookie: {
        httpOnly: true,
        sameSite: 'lax',
        secure: config.secure,
        path: '/',
        maxAge: APPLICANT_IDLE_MS,
      },
    }),
    passport.session() as RequestHandler,
  ];
}
