import { conflict, forbidden, notFound } from '../../errors/problem';
import type { Transaction } from '../../database/transaction';
import type { Revision } from '../../entities/filed.entities';
import type { Finding } from '../../entities/verdict.entities';
import { revokeByIds, standingDispositions } from '../../repositories/disposition.repository';
import { findRevision } from '../../repositories/revision.repository';
import { findingsOfRun, findRun, listRuns, updateRun } from '../../repositories/run.repository';
import type { AdoptRunRequest } from '../../../shared/contracts/api.generated';
import { outgrown } from '../../../shared/workflow/dispositions';
import type { Caller } from '../cases/caller';
import { holdCase, readCase, type CaseFile } from '../cases/case-file';
import { recordStep } from '../cases/record-step';
import { requireRevision } from '../cases/revision-changes';
import { queueRun } from '../filing/queue-run';
import { carryDispositions } from '../filing/run-check';

/** A revision of a case that was read under the caller's rules; what is not there is not found. */
export async function revisionOf(caller: Caller, file: CaseFile, letter: string): Promise<Revision> {
  const revision = await findRevision(caller.tx.manager, caller.ability, file.application.id, letter);
  if (revision === null) throw notFound();
  return revision;
}

/** Asks for another run of a revision, under the rules in force now. A run that failed is replaced as governing. */
export async function checkAgain(caller: Caller, reference: string, letter: string): Promise<number> {
  const { tx, actor } = caller;
  const file = await holdCase(caller, reference, 'review');
  const revision = await revisionOf(caller, file, letter);
  const runs = await listRuns(tx.manager, revision.id);
  if (runs.some((run) => run.status === 'queued' || run.status === 'running')) {
    throw conflict('A check of this revision is under way already.');
  }
  const governing = runs.find((run) => run.governing);
  const replaces = governing?.status === 'failed';
  if (replaces) await updateRun(tx.manager, governing.id, { governing: false });
  await queueRun(tx, revision, { governing: replaces, requestedBy: actor.userId });
  const ordinal = (runs[0]?.ordinal ?? 0) + 1;
  recordStep(tx, file, 'check.asked', { revision: letter, run: ordinal });
  return ordinal;
}

/** Makes a later run govern the current revision: its findings replace those of the run before. */
export async function adoptRun(
  caller: Caller,
  reference: string,
  letter: string,
  ordinal: number,
  request: AdoptRunRequest,
): Promise<void> {
  const { tx, actor } = caller;
  const file = await holdCase(caller, reference, 'review');
  const revision = await requireRevision(caller, file, letter);
  if (file.round.state !== 'in-review' || file.round.reviewerId !== actor.userId) {
    throw forbidden('The case’s reviewer adopts a run, while the case is in review.');
  }
  const run = await findRun(tx.manager, revision.id, ordinal);
  if (run === null) throw notFound();
  if (run.governing) throw conflict('This run governs already.');
  if (run.status !== 'done') throw conflict('A run is adopted once it is done.');
  if (file.run !== null) await updateRun(tx.manager, file.run.id, { governing: false });
  await updateRun(tx.manager, run.id, { governing: true });
  const findings = await findingsOfRun(tx.manager, run.id);
  // first what stands no more, so that it is not in the way of what may be carried over
  await revokeOutgrown(tx, revision, findings);
  await carryDispositions(tx, revision, findings);
  recordStep(tx, file, 'check.adopted', { run: ordinal, reason: request.reason }, { run: file.run?.ordinal });
}

async function revokeOutgrown({ manager, now }: Transaction, { id }: Revision, findings: readonly Finding[]) {
  const left = outgrown(await standingDispositions(manager, id), findings);
  await revokeByIds(
    manager,
    left.map((disposition) => disposition.id),
    now,
  );
}

/** Runs of a revision, newest first. */
export async function runsOf(caller: Caller, reference: string, letter: string) {
  const file = await readCase(caller, reference);
  const revision = await revisionOf(caller, file, letter);
  return { revision, runs: await listRuns(caller.tx.manager, revision.id) };
}
