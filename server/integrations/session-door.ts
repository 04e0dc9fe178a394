/** What a session remembers. The rights are looked up again at each request. */
export interface SessionState {
  userId: string;
  orgId: string;
  /** The password was right, but a second step is still to come. */
  stage: 'half' | 'full';
  /** Milliseconds; the absolute limit counts from it. */
  signedInAt: number;
  csrfToken: string;
  /** How long it lives without use. */
  idleMinutes: number;
}

/** Answers who an email and a password belong to. */
export type PasswordCheck = (email: string, password: string) => Promise<{ id: string } | null>;

/** The session of one request: read it, begin a new one at every change of rights, end it. */
export interface SessionDoor {
  readonly id: string;
  /** Nothing when nobody is signed in or the session has run out. */
  readonly state: SessionState | null;
  /** Runs the sign-in strategy over what the request brought. */
  authenticate(check: PasswordCheck): Promise<{ id: string } | null>;
  /** A new session under a new id and token; the old id is dead from here on. */
  begin(
    state: Omit<SessionState, 'csrfToken' | 'signedInAt'> & { signedInAt?: number },
  ): Promise<SessionState>;
  end(): Promise<void>;
}
