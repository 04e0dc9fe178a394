import type { Fault } from '#shared/contracts/api.generated';
import { problemName, type Problem, type ProblemName } from '#shared/contracts/errors';

/** A request that the server refused, with its own words for why. Recognise kinds by `type`, never by text. */
export class ApiProblem extends Error {
  readonly type: string;
  readonly status: number;
  readonly title: string;
  /** Faults of fields, of a problem that has them. */
  readonly faults: readonly Fault[];
  /** The problem's short name, or undefined for one that our contract does not list. */
  readonly problem: ProblemName | undefined;
  /** Everything the server sent: faults of fields, what changed meanwhile. */
  readonly body: Problem;

  constructor(body: Problem) {
    super(body.detail ?? body.title);
    this.name = 'ApiProblem';
    this.type = body.type;
    this.status = body.status;
    this.title = body.title;
    this.faults = body.errors ?? [];
    this.problem = problemName(body.type);
    this.body = body;
  }
}

/** The server could not be reached at all; nothing is known about whether it acted. */
export class ConnectionLost extends Error {
  constructor(cause: unknown) {
    super('The server cannot be reached. Nothing you typed is lost; try again in a moment.', { cause });
    this.name = 'ConnectionLost';
  }
}

function isProblem(body: unknown): body is Problem {
  return typeof body === 'object' && body !== null && 'type' in body && 'title' in body && 'status' in body;
}

/** Reads a refusal. An answer that is no problem document still becomes one, by its status. */
export async function readProblem(response: Response): Promise<ApiProblem> {
  const body: unknown = await response.json().catch(() => null);
  if (isProblem(body)) return new ApiProblem(body);
  return new ApiProblem({
    type: 'about:blank',
    title: 'The server gave an answer that we cannot read',
    status: response.status,
    detail: `The server answered with status ${response.status} and no explanation. Try again in a moment.`,
  });
}
