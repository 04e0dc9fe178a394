import type { Request } from 'express';
import passportModule from 'passport';
import type { PasswordCheck } from '../integrations/session-door';
import { Strategy as LocalStrategy } from 'passport-local';

export const passport = new passportModule.Passport();

// The check belongs to the request's own transaction, so it is handed over with the request.
const checks = new WeakMap<object, PasswordCheck>();

passport.serializeUser((user, done) => done(null, user.id));
passport.deserializeUser((id: string, done) => done(null, { id }));
passport.use(
  new LocalStrategy({ usernameField: 'email', passReqToCallback: true }, (request, email, password, done) => {
    const check = checks.get(request);
    if (!check) return done(new Error('no password check for this request'));
    check(email, password).then((user) => done(null, user ?? false), done);
  }),
);

/** Runs the local strategy over the request's body; nobody, where the check knows nobody. */
export function authenticate(request: Request, check: PasswordCheck): Promise<{ id: string } | null> {
  checks.set(request, check);
  return new Promise((done, fail) => {
    const run = passport.authenticate(
      'local',
      { session: false },
      (error: unknown, user?: Express.User | false) => {
        if (error) fail(error as Error);
        else done(user || null);
      },
    ) as (request: Request, response: unknown, next: (error: unknown) => void) => void;
    run(request, request.res, fail);
  });
}
