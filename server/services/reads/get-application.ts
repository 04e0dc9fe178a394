import { revisionLetters } from '../../repositories/revision.repository';
import { countersignsByIds, pendingCountersigns } from '../../repositories/disposition.repository';
import { draftLines } from '../../repositories/draft.repository';
import { decisionOfRound, windowsOfApplication } from '../../repositories/correspondence.repository';
import { overviewOf } from '../../repositories/overview.repository';
import { gridOwner, namesOf } from '../../repositories/people-names.repository';
import {
  presentApplication,
  presentDecision,
  type ApplicationDetail,
} from '../../presenters/application.presenter';
import { draftTotals } from '../../presenters/draft.presenter';
import { presentCountersign } from '../../presenters/countersign.presenter';
import { notFound } from '../../errors/problem';
import type * as Api from '../../../shared/contracts/api.generated';
import { checkStep, STEP_RULES, STEPS } from '../../../shared/workflow/steps';
import type { Caller } from '../cases/caller';
import { sightOf } from '../cases/caller';
import { readCase, type CaseFile } from '../cases/case-file';
import { gatherFacts } from '../cases/gather-facts';
import { spanOf } from '../windows/change-windows';
import { readingOf } from './list-applications';

/** An application with all that its page shows. */
export async function getApplication(caller: Caller, reference: string): Promise<Api.Application> {
  const { tx, actor } = caller;
  const file = await readCase(caller, reference);
  const row = await overviewOf(tx.manager, file.application.id, sightOf(actor));
  if (row === null) throw notFound();
  // before the first filing the voltages and the length are those of the draft
  const drafted = file.revision === null ? draftTotals(await draftLines(tx.manager, file.round.id)) : {};
  return presentApplication({ ...row, ...drafted }, await detailOf(caller, file), await readingOf(caller));
}

async function detailOf(caller: Caller, file: CaseFile): Promise<ApplicationDetail> {
  const { tx, actor } = caller;
  const { application, round } = file;
  const { manager } = tx;
  const facts = await gatherFacts(caller, file);
  const steps = STEPS.filter((step) => STEP_RULES[step].role === actor.role).map((step) => {
    const answer = checkStep(step, facts, actor);
    return { step, open: answer.open, reason: answer.open ? null : answer.reason };
  });
  const letters = await revisionLetters(manager, application.id);
  const windows = await windowsOfApplication(manager, application.id);
  return {
    application,
    round: { ordinal: round.ordinal, kind: round.kind, reason: round.reason },
    acceptedRevision: letters.get(application.acceptedRevisionId ?? '') ?? null,
    owner: await gridOwner(manager),
    steps,
    windows: windows.map(spanOf),
    decision: await decisionOf(caller, file, letters),
    countersigns: await countersignsOf(caller, file),
  };
}

async function decisionOf(
  { tx }: Caller,
  { round }: CaseFile,
  letters: ReadonlyMap<string, string>,
): Promise<Api.Decision | null> {
  const decision = await decisionOfRound(tx.manager, round.id);
  if (decision === null) return null;
  const countersigns = await countersignsByIds(tx.manager, [decision.countersignId ?? ''].filter(Boolean));
  const second = countersigns.get(decision.countersignId ?? '')?.decidedBy ?? null;
  const people = await namesOf(tx.manager, [decision.decidedBy, second]);
  return presentDecision(decision, letters, people, second);
}

/** Proposals on the current revision: among reviewers only. */
async function countersignsOf({ tx, actor }: Caller, file: CaseFile): Promise<Api.Countersign[]> {
  if (actor.role !== 'reviewer' || file.revision === null) return [];
  const pending = await pendingCountersigns(tx.manager, file.revision.id);
  const people = await namesOf(
    tx.manager,
    pending.map((p) => p.proposedBy),
  );
  const { number } = file.application;
  const { letter } = file.revision;
  const current = file.round.state === 'in-review';
  return pending.map((p) => presentCountersign(p, { number, letter, current }, people));
}
