/** One fault of a request's content, with the place it stands at. */
export interface ProblemFault {
  pointer?: string;
  row?: number;
  column?: string;
  value?: unknown;
  expected?: string;
  message: string;
}

/** Every kind of refusal; the `type` of the answer is `/problems/<kind>` and never changes its meaning. */
export const PROBLEMS = {
  'invalid-request': { status: 400, title: 'The request cannot be read' },
  'not-signed-in': { status: 401, title: 'Sign in to go on' },
  'sign-in-refused': { status: 401, title: 'Email or password does not match' },
  'code-refused': { status: 401, title: 'The code does not match' },
  forbidden: { status: 403, title: 'Your role may not do this' },
  'cross-site': { status: 403, title: 'The request did not come from a page of this site' },
  'not-found': { status: 404, title: 'Not found' },
  'method-not-allowed': { status: 405, title: 'This address does not take that method' },
  conflict: { status: 409, title: 'This is not possible in the present state' },
  stale: { status: 409, title: 'Somebody changed this in the meantime' },
  'in-flight': { status: 409, title: 'The same request is still being worked on' },
  gone: { status: 410, title: 'This link has been used or has expired' },
  'too-large': { status: 413, title: 'The request is too large' },
  'unsupported-media-type': { status: 415, title: 'This kind of content is not taken here' },
  'invalid-content': { status: 422, title: 'Some entries need correcting' },
  'key-reused': { status: 422, title: 'The Idempotency-Key belongs to another request' },
  'too-many-requests': { status: 429, title: 'Too many attempts' },
  internal: { status: 500, title: 'Something went wrong here' },
  unavailable: { status: 503, title: 'Not available for the moment' },
} as const;

export type ProblemKind = keyof typeof PROBLEMS;

export interface ProblemDetails {
  detail?: string;
  errors?: ProblemFault[];
  /** Further members of the answer, such as what changed since the client last looked. */
  extra?: Record<string, unknown>;
  retryAfterSeconds?: number;
}

/** A refusal that the client is told about. Anything else thrown becomes a plain 500. */
export class Problem extends Error {
  readonly kind: ProblemKind;
  readonly details: ProblemDetails;

  constructor(kind: ProblemKind, details: ProblemDetails = {}) {
    super(details.detail ?? PROBLEMS[kind].title);
    this.name = 'Problem';
    this.kind = kind;
    this.details = details;
  }
}

export const notFound = () => new Problem('not-found');
export const conflict = (detail: string, extra?: Record<string, unknown>) =>
  new Problem('conflict', { detail, extra });
export const stale = (detail: string, extra?: Record<string, unknown>) =>
  new Problem('stale', { detail, extra });
export const forbidden = (detail?: string) => new Problem('forbidden', { detail });
export const invalidContent = (errors: ProblemFault[], detail?: string) =>
  new Problem('invalid-content', { errors, detail });
