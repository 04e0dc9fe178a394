import type { Application, Round } from '../../entities/case.entities';
import type { Revision } from '../../entities/filed.entities';
import { forbidden, notFound } from '../../errors/problem';
import { findApplication, latestRound, lockRound } from '../../repositories/application.repository';
import { latestRevision } from '../../repositories/revision.repository';
import { governingRun, type RunHead } from '../../repositories/run.repository';
import type { Action } from '../../../shared/policies/subjects';
import { sightOf, type Caller } from './caller';

/** An application with the round, the revision and the run that count for who asks. */
export interface CaseFile {
  application: Application;
  round: Round;
  revision: Revision | null;
  run: RunHead | null;
}

/** An application as the ability's rules look at it. */
export function applicationRecord({ orgId, firstFiledAt }: Application) {
  return { kind: 'Application' as const, orgId, firstFiledAt };
}

/** Reads a case; what the caller may not see is not found. */
export async function readCase(caller: Caller, reference: string): Promise<CaseFile> {
  const { tx, ability, actor } = caller;
  const application = await findApplication(tx.manager, ability, reference);
  if (application === null) throw notFound();
  const round = await latestRound(tx.manager, application.id, sightOf(actor));
  if (round === null) throw notFound();
  return complete(caller, application, round);
}

/** Reads a case to write to it: the action has to be allowed, and the case is held until the transaction ends. */
export async function holdCase(caller: Caller, reference: string, action: Action): Promise<CaseFile> {
  const { tx, ability } = caller;
  const { application, round } = await readCase(caller, reference);
  if (!ability.can(action, applicationRecord(application))) throw forbidden();
  // read again once it is held: whoever held it before may have moved it
  return complete(caller, application, await lockRound(tx.manager, round.id));
}

async function complete({ tx, actor }: Caller, live: Application, round: Round): Promise<CaseFile> {
  const revision = await latestRevision(tx.manager, live.id);
  const run = revision === null ? null : await governingRun(tx.manager, revision.id);
  const application = actor.role === 'applicant' || revision === null ? live : asFiled(live, revision);
  return { application, round, revision, run };
}

/** What the applicant changes of the head for the next revision is a draft, which the owner's people do not see. */
function asFiled(application: Application, { particulars }: Revision): Application {
  const { note: _note, ...head } = particulars;
  return { ...application, ...(head as Partial<Application>) };
}

/** The current revision of a case whose state says that there is one. */
export function filedRevision(file: CaseFile): Revision {
  if (file.revision === null) throw new Error(`application ${file.application.id} has no revision`);
  return file.revision;
}
