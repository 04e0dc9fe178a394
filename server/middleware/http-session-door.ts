import { randomBytes } from 'node:crypto';
import type { Request } from 'express';
import { authenticate } from './passport';
import type { PasswordCheck, SessionDoor, SessionState } from '../integrations/session-door';

declare module 'express-session' {
  interface SessionData {
    state?: SessionState;
  }
}

const HOUR_MS = 3_600_000;
export const ABSOLUTE_LIMIT_MS = 8 * HOUR_MS;

/** The session of one request: read it, begin a new one at every change of rights, end it. */
export class HttpSessionDoor implements SessionDoor {
  constructor(
    private readonly request: Request,
    private readonly now: () => Date,
  ) {}

  get id(): string {
    return this.request.sessionID;
  }

  /** What the session remembers; nothing after eight hours, whatever its use. */
  get state(): SessionState | null {
    const state = this.request.session.state;
    if (!state || this.request.session.passport?.user !== state.userId) return null;
    return this.now().getTime() - state.signedInAt < ABSOLUTE_LIMIT_MS ? state : null;
  }

  /** Runs the sign-in strategy over the request's body. */
  authenticate(check: PasswordCheck): Promise<{ id: string } | null> {
    return authenticate(this.request, check);
  }

  /** A new session under a new id; the old id is dead from here on. */
  async begin(
    state: Omit<SessionState, 'csrfToken' | 'signedInAt'> & { signedInAt?: number },
  ): Promise<SessionState> {
    await new Promise<void>((done, fail) => {
      this.request.logIn({ id: state.userId }, (error: unknown) => (error ? fail(error as Error) : done()));
    });
    const begun: SessionState = {
      ...state,
      signedInAt: state.signedInAt ?? this.now().getTime(),
      csrfToken: randomBytes(32).toString('base64url'),
    };
    this.request.session.state = begun;
    this.request.session.cookie.maxAge = state.idleMinutes * 60_000;
    return begun;
  }

  async end(): Promise<void> {
    await new Promise<void>((done, fail) => {
      this.request.session.destroy((error: unknown) => (error ? fail(error as Error) : done()));
    });
  }
}
