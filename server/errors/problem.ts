import { PROBLEMS } from '../../shared/contracts/errors';
import type { ProblemName } from '../../shared/contracts/errors';

/** One fault of a request's content, with the place it stands at. */
export interface ProblemFault {
  pointer?: string;
  row?: number;
  column?: string;
  value?: unknown;
  expected?: string;
  message: string;
}

export interface ProblemDetails {
  detail?: string;
  errors?: readonly ProblemFault[];
  /** Further members of the answer, such as what changed since the client last looked. */
  extra?: Record<string, unknown>;
  retryAfterSeconds?: number;
}

/** A refusal that the client is told about. Anything else thrown becomes a plain 500. */
export class Problem extends Error {
  readonly kind: ProblemName;
  readonly details: ProblemDetails;

  constructor(kind: ProblemName, details: ProblemDetails = {}) {
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
export const invalidContent = (errors: readonly ProblemFault[], detail?: string) =>
  new Problem('invalid-content', { errors, detail });
