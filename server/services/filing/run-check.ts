import { inTransaction, type Transaction } from '../../database/transaction';
import { system } from '../../database/actor';
import { recordEvent } from '../../database/audit/record-event';
import { Revision } from '../../entities/filed.entities';
import type { Surroundings } from '../../integrations/surroundings';
import { insertDispositions, standingDispositions } from '../../repositories/disposition.repository';
import { linesOfRevision, revisionBefore, type FiledLine } from '../../repositories/revision.repository';
import { conductorLibrary } from '../../repositories/conductor.repository';
import { ruleSetById } from '../../repositories/rule-set.repository';
import {
  findRunById,
  insertResults,
  lockRun,
  updateRun,
  type RunHead,
} from '../../repositories/run.repository';
import type { RuleSet } from '../../../shared/checks/rule-set';
import type { CheckReport } from '../../../shared/checks/types';
import type { ConductorLibrary } from '../../../shared/library/types';
import { readLine } from '../../../shared/filing/read-filing';
import type { LineSheet, NormalisedFiling } from '../../../shared/filing/types';
import { carryOver, type GradedFinding } from '../../../shared/workflow/dispositions';
import { findingRows, valueRows } from './run-rows';

const ACTOR = system('check');

/** For how long a check may compute; the queue gives the job to another worker a little later. */
const LONGEST_CHECK_MS = 540_000;

interface Work {
  run: RunHead;
  rules: RuleSet;
  lines: FiledLine[];
  filing: NormalisedFiling;
}

/**
 * Makes a check run: the worker's whole job. It may be called twice for one run; what is done stays done. The check
 * itself runs between two transactions, so that nothing is held while it computes.
 */
export async function runCheck(surroundings: Surroundings, runId: string): Promise<void> {
  const work = await inTransaction(surroundings, ACTOR, (tx) => begin(tx, runId));
  if (work === null) return;
  try {
    const { filing, rules } = work;
    const limit = AbortSignal.timeout(LONGEST_CHECK_MS);
    const report = await surroundings.tools.checker.check({ filing, rules }, limit);
    await inTransaction(surroundings, ACTOR, (tx) => finish(tx, work, report));
  } catch (error) {
    await inTransaction(surroundings, ACTOR, (tx) => giveUp(tx, runId));
    throw error;
  }
}

async function begin(tx: Transaction, runId: string): Promise<Work | null> {
  const run = await lockRun(tx.manager, runId);
  if (run === null || run.status === 'done') return null;
  await updateRun(tx.manager, runId, { status: 'running', startedAt: tx.now, failure: null });
  const lines = await linesOfRevision(tx.manager, run.revisionId);
  const { rules } = await ruleSetById(tx.manager, run.ruleSetId);
  const filing = filingOf(lines, rules, await conductorLibrary(tx.manager));
  return { run, rules, lines, filing };
}

/** The frozen lines, read again: they hold their conductors' data and their digits, so nothing else counts. */
function filingOf(lines: readonly FiledLine[], rules: RuleSet, library: ConductorLibrary): NormalisedFiling {
  return {
    lines: lines.map(({ body, name }, i) => {
      const { line, written, assumed } = body as unknown as LineSheet;
      const read = readLine(line, { library, owner: rules.owner, written, assumed, pointer: `/lines/${i}` });
      if (!read.ok) throw new Error(`the filed line ${name} cannot be read any more`);
      return read.line;
    }),
  };
}

async function finish(tx: Transaction, { run, lines }: Work, report: CheckReport): Promise<void> {
  const held = await lockRun(tx.manager, run.id);
  if (held === null || held.status === 'done') return;
  const keys = lines.map((line) => line.lineKey);
  const findings = findingRows(run, keys, report);
  await insertResults(tx.manager, findings, valueRows(run, keys, report));
  await updateRun(tx.manager, run.id, {
    status: 'done',
    finishedAt: tx.now,
    engineVersion: report.engine,
    linesDone: lines.length,
    report: report as never,
  });
  const revision = await tx.manager.findOneByOrFail(Revision, { id: run.revisionId });
  if (held.governing) await carryDispositions(tx, revision, findings);
  recordEvent(tx, {
    act: 'check.done',
    orgId: run.orgId,
    applicationId: revision.applicationId,
    after: { revision: revision.letter, run: run.ordinal, engine: report.engine, findings: findings.length },
  });
}

/** What stood on the revision before stands on this one too, where code, circuit and figures are equal. */
export async function carryDispositions(
  tx: Transaction,
  revision: Revision,
  findings: readonly GradedFinding[],
): Promise<void> {
  const before = await revisionBefore(tx.manager, revision);
  if (before === null) return;
  const standing = new Set(
    (await standingDispositions(tx.manager, revision.id)).map((d) => `${d.lineKey} ${d.fingerprint}`),
  );
  const carried = carryOver(await standingDispositions(tx.manager, before.id), findings).filter(
    (d) => !standing.has(`${d.lineKey} ${d.fingerprint}`),
  );
  await insertDispositions(
    tx.manager,
    carried.map((d) => ({
      orgId: d.orgId,
      revisionId: revision.id,
      lineKey: d.lineKey,
      fingerprint: d.fingerprint,
      kind: d.kind,
      reason: d.reason,
      decidedBy: d.decidedBy,
      decidedAt: d.decidedAt,
      countersignId: d.countersignId,
      discrepancyId: d.discrepancyId,
      carriedFrom: d.id,
    })),
  );
}

/** Tells people that it failed; the queue tries again, and a reviewer can ask for another run. */
async function giveUp(tx: Transaction, runId: string): Promise<void> {
  const run = await findRunById(tx.manager, runId);
  if (run === null || run.status === 'done') return;
  await updateRun(tx.manager, runId, {
    status: 'failed',
    finishedAt: tx.now,
    failure:
      'The check stopped before its end. It is tried again by itself; a reviewer can ask for another one.',
  });
}
