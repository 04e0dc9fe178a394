/** Problem details (RFC 9457) that the API answers with: stable types, their status and their titles. */
import type { Fault } from './api.generated';

/** Every problem by its short name. `type` on the wire is `/problems/<name>`. */
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
  'already-taken': { status: 409, title: 'Somebody else has it' },
  'check-running': { status: 409, title: 'The check is still running' },
  stale: { status: 409, title: 'Somebody changed this in the meantime' },
  'in-flight': { status: 409, title: 'The same request is still being worked on' },
  gone: { status: 410, title: 'This link has been used or has expired' },
  'too-large': { status: 413, title: 'The request is too large' },
  'unsupported-media-type': { status: 415, title: 'This kind of content is not taken here' },
  'invalid-content': { status: 422, title: 'Some entries need correcting' },
  'key-reused': { status: 422, title: 'The Idempotency-Key belongs to another request' },
  'version-required': { status: 428, title: 'Say which version you read' },
  'too-many-requests': { status: 429, title: 'Too many attempts' },
  internal: { status: 500, title: 'Something went wrong here' },
  unavailable: { status: 503, title: 'Not available for the moment' },
} as const;

/** Short name of a problem. */
export type ProblemName = keyof typeof PROBLEMS;

/** A problem as it goes over the wire. */
export interface Problem {
  /** `/problems/<name>`, stable. */
  type: string;
  title: string;
  /** HTTP status. */
  status: number;
  /** What happened here and what opens it, as a sentence. */
  detail?: string;
  /** Path of the request. */
  instance?: string;
  requestId?: string;
  /** Faults of fields, each with its JSON Pointer, or row and column. */
  errors?: Fault[];
  /** Of a stale write: what changed since, as sentences. */
  changed?: string[];
  /** Of a stale write: the version that holds now. */
  currentVersion?: number;
  /** Of a stale decision: the revision that holds now. */
  currentRevision?: string;
  /** Of a step that is closed: the state of the round. */
  state?: string;
}

/**
 * The `type` of a problem.
 * @param name short name
 * @returns relative URI reference
 */
export function problemType(name: ProblemName): string {
  return `/problems/${name}`;
}

/**
 * The short name of a problem that came over the wire.
 * @param type its `type`
 * @returns the name, or undefined for one that this table does not have
 */
export function problemName(type: string): ProblemName | undefined {
  const name = type.replace(/^\/problems\//, '');
  return Object.hasOwn(PROBLEMS, name) ? (name as ProblemName) : undefined;
}
