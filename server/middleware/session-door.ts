import { randomBytes } from 'node:crypto';
import type { Request } from 'express';

/** What a session remembers. The rights are looked up again at each request. */
export interface SessionState {
  userId: string;
  orgId: string;
  /** The password was right, but a second step is still to come. */
  stage: 'half' | 'full';
  /** Milliseconds; the absolute limit counts from it. */
  signedInAt: number;
  csrfToken: string;
  /** Sent along with the address of a new second factor, until its first code is given. */
  idleMinutes: number;
}

declare module 'express-session' {
  interface SessionData {
    state?: SessionState;
  }
}

const HOUR_MS = 3_600_000;
export const ABSOLUTE_LIMIT_MS = 8 * HOUR_MS;

/** The session of one request: read it, begin a new one at every change of rights, end it. */
export class SessionDoor {
  constructor(
    private readonly request: Request,
    private readonly now: () => Date,
  ) {}

  /** What the session remembers; nothing after eight hours, whatever its use. */
  get state(): SessionState | null {
    const state = this.request.session.state;
    if (!state || this.request.session.passport?.user !== state.userId) return null;
    return this.now().getTime() - state.signedInAt < ABSOLUTE_LIMIT_MS ? state : null;
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
