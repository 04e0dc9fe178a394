import type { DraftLine, SaveDraftLineRequest } from '#shared/contracts/api.generated';
import { problemName } from '#shared/contracts/errors';
import { call } from '../../../lib/api/call';
import { ApiProblem } from '../../../lib/api/problem';

/** Saves a line of the draft, complete or not, on top of the version that was read (0 for a new one). */
export const saveDraftLine = (
  number: string,
  lineKey: string,
  body: SaveDraftLineRequest,
  idempotencyKey: string,
): Promise<DraftLine> =>
  call('saveDraftLine', { params: { applicationId: number, lineKey }, body, idempotencyKey });

/** Whether a refusal means that somebody else saved the line in between. */
export const isStale = (error: unknown): boolean =>
  error instanceof ApiProblem && problemName(error.type) === 'stale';
