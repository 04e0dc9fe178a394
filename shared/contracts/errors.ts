/** Problem details (RFC 9457) that the API answers with: stable types, their status and their titles. */
import type { Fault } from './api.generated';

/** Every problem by its short name. `type` on the wire is `/problems/<name>`. */
export const PROBLEMS = {
  'malformed-request': { status: 400, title: 'The request cannot be read' },
  'not-signed-in': { status: 401, title: 'Sign in first' },
  'wrong-credentials': { status: 401, title: 'Address or password is not right' },
  forbidden: { status: 403, title: 'Your role does not do this' },
  'csrf-missing': { status: 403, title: 'The request does not come from this product’s page' },
  'not-found': { status: 404, title: 'Not found' },
  'method-not-allowed': { status: 405, title: 'This address does not take that method' },
  'not-acceptable': { status: 406, title: 'No answer in the form asked for' },
  'wrong-state': { status: 409, title: 'Not in this state' },
  'step-closed': { status: 409, title: 'Not open yet' },
  stale: { status: 409, title: 'Changed since you read it' },
  'check-running': { status: 409, title: 'The check is still running' },
  'already-taken': { status: 409, title: 'Somebody else has it' },
  'in-flight': { status: 409, title: 'The same request is being worked on' },
  conflict: { status: 409, title: 'Already there' },
  'too-large': { status: 413, title: 'Too large' },
  'unsupported-media': { status: 415, title: 'This kind of file is not taken' },
  faults: { status: 422, title: 'Something in it needs another look' },
  'key-reused': { status: 422, title: 'The idempotency key was used for another request' },
  'version-required': { status: 428, title: 'Say which version you read' },
  'too-many-requests': { status: 429, title: 'Too many requests' },
  'internal-error': { status: 500, title: 'Something went wrong here' },
  unavailable: { status: 503, title: 'Not available just now' },
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
  /** Seconds after which to try again. */
  retryAfterS?: number;
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
