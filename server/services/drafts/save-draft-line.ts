import { conditionalUpdate } from '../../database/conditional-update';
import { recordEvent } from '../../database/audit/record-event';
import { DraftLine } from '../../entities/case.entities';
import { conflict, notFound, stale } from '../../errors/problem';
import {
  draftLines,
  findDraftLine,
  insertDraftLines,
  removeDraftLine,
} from '../../repositories/draft.repository';
import type { SaveDraftLineRequest } from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { holdCase, type CaseFile } from '../cases/case-file';
import { requireEditable } from './update-application';

export const MAX_LINES = 500;

/** Saves a line of the draft as it stands, complete or not; version 0 makes a new one. */
export async function saveDraftLine(
  caller: Caller,
  reference: string,
  lineKey: string,
  request: SaveDraftLineRequest,
): Promise<DraftLine> {
  const { tx } = caller;
  const file = await holdCase(caller, reference, 'update');
  requireEditable(file);
  const known = await findDraftLine(tx.manager, file.round.id, lineKey);
  const version = request.version ?? 0;
  if (version === 0) await addLine(caller, file, lineKey, request, known);
  else await changeLine(caller, known, version, request);
  const saved = await findDraftLine(tx.manager, file.round.id, lineKey);
  if (saved === null) throw notFound();
  return saved;
}

async function addLine(
  { tx, actor }: Caller,
  { round, application }: CaseFile,
  lineKey: string,
  request: SaveDraftLineRequest,
  known: DraftLine | null,
): Promise<void> {
  if (known !== null) throw staleLine(known);
  const others = await draftLines(tx.manager, round.id);
  if (others.length >= MAX_LINES) throw conflict(`An application holds at most ${MAX_LINES} lines.`);
  const last = others.at(-1)?.ordinal ?? 0;
  await insertDraftLines(tx.manager, [
    {
      orgId: application.orgId,
      roundId: round.id,
      lineKey,
      ordinal: request.ordinal ?? last + 1,
      body: request.line as never,
      asTyped: (request.asTyped ?? {}) as never,
      updatedAt: tx.now,
      updatedBy: actor.userId,
    },
  ]);
  recordEvent(tx, {
    act: 'line.added',
    orgId: application.orgId,
    applicationId: application.id,
    after: { lineKey, name: nameOf(request.line) },
  });
}

async function changeLine(
  { tx, actor }: Caller,
  known: DraftLine | null,
  version: number,
  request: SaveDraftLineRequest,
): Promise<void> {
  if (known === null) throw notFound();
  if (known.version !== version) throw staleLine(known);
  await conditionalUpdate(
    tx.manager,
    DraftLine,
    { id: known.id, version },
    {
      body: request.line,
      ordinal: request.ordinal ?? known.ordinal,
      asTyped: request.asTyped ?? known.asTyped,
      updatedAt: tx.now,
      updatedBy: actor.userId,
    },
  );
}

function staleLine(known: DraftLine) {
  return stale('This line was saved by somebody else, or in another window, since you last saw it.', {
    currentVersion: known.version,
    changed: [`${known.lineKey} was saved at ${known.updatedAt.toISOString()}.`],
  });
}

/** Removes a line from the draft; revisions that hold it keep it. */
export async function deleteDraftLine(
  caller: Caller,
  reference: string,
  lineKey: string,
  version: number | undefined,
): Promise<void> {
  const { tx } = caller;
  const file = await holdCase(caller, reference, 'update');
  requireEditable(file);
  const known = await findDraftLine(tx.manager, file.round.id, lineKey);
  if (known === null) throw notFound();
  if (version !== undefined && version !== known.version) throw staleLine(known);
  if (!(await removeDraftLine(tx.manager, known))) throw staleLine(known);
  recordEvent(tx, {
    act: 'line.removed',
    orgId: file.application.orgId,
    applicationId: file.application.id,
    before: { lineKey, name: nameOf(known.body) },
  });
}

function nameOf(line: unknown): string | null {
  const name = (line as { name?: unknown } | null)?.name;
  return typeof name === 'string' ? name : null;
}
