import { invalidContent } from '../../errors/problem';
import type { Finding } from '../../entities/verdict.entities';
import {
  addEntry,
  insertDiscrepancy,
  nextDiscrepancyNumber,
} from '../../repositories/discrepancy.repository';
import { linesOfRevision } from '../../repositories/revision.repository';
import { findingsOfRun } from '../../repositories/run.repository';
import type { RaiseDiscrepancyRequest } from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { filedRevision, holdCase, type CaseFile } from '../cases/case-file';
import { gatherFacts } from '../cases/gather-facts';
import { recordStep } from '../cases/record-step';
import { requireRevision } from '../cases/revision-changes';
import { requireStep } from '../cases/take-step';

/** Raises a discrepancy from findings, or by hand. Answers its number. */
export async function raiseDiscrepancy(
  caller: Caller,
  reference: string,
  request: RaiseDiscrepancyRequest,
): Promise<number> {
  const { tx, actor } = caller;
  const file = await holdCase(caller, reference, 'review');
  await requireRevision(caller, file, request.revision);
  requireStep(caller, 'raise', await gatherFacts(caller, file));
  const findings = await findingsNamed(caller, file, request.fingerprints ?? []);
  const lineKeys = await linesNamed(caller, file, request.lineKeys ?? [], findings);
  const { application, round } = file;
  const revision = filedRevision(file);
  const number = await nextDiscrepancyNumber(tx.manager, application.id);
  const { orgId } = application;
  const raised = { raisedOnRevisionId: revision.id, raisedBy: actor.userId, raisedAt: tx.now };
  const discrepancyId = await insertDiscrepancy(
    tx.manager,
    {
      orgId,
      applicationId: application.id,
      roundId: round.id,
      number,
      state: 'open',
      title: request.title.trim(),
      questioned: request.question,
      wouldSettle: request.wanted ?? null,
      lineKeys,
      ...raised,
    },
    findings,
  );
  await addEntry(tx.manager, {
    orgId,
    discrepancyId,
    kind: 'raised',
    text: request.question,
    revisionId: revision.id,
    writtenBy: actor.userId,
    writtenAt: tx.now,
  });
  recordStep(tx, file, 'discrepancy.raised', {
    number,
    title: request.title,
    findings: request.fingerprints ?? [],
  });
  return number;
}

/** The findings named, and those that one matter explains with them. */
async function findingsNamed(
  { tx }: Caller,
  file: CaseFile,
  fingerprints: readonly string[],
): Promise<Finding[]> {
  if (fingerprints.length === 0 || file.run === null) return [];
  const all = await findingsOfRun(tx.manager, file.run.id);
  const groups = new Set<string>();
  for (const [i, fingerprint] of fingerprints.entries()) {
    const finding = all.find((f) => f.fingerprint === fingerprint);
    if (finding === undefined) {
      throw unknown(`/fingerprints/${i}`, fingerprint, 'a finding of the current revision');
    }
    groups.add(groupKey(finding));
  }
  return all.filter((f) => fingerprints.includes(f.fingerprint) || groups.has(groupKey(f)));
}

function groupKey(finding: Finding): string {
  const group = finding.groupNumber === null ? `alone ${finding.id}` : finding.groupNumber;
  return `${finding.lineKey} ${finding.circuit} ${group}`;
}

async function linesNamed(
  { tx }: Caller,
  file: CaseFile,
  named: readonly string[],
  findings: readonly Finding[],
): Promise<string[]> {
  const lines = await linesOfRevision(tx.manager, filedRevision(file).id);
  const known = new Set(lines.map((line) => line.lineKey));
  named.forEach((lineKey, i) => {
    if (!known.has(lineKey)) throw unknown(`/lineKeys/${i}`, lineKey, 'a line of the current revision');
  });
  return [...new Set([...named, ...findings.map((f) => f.lineKey)])];
}

function unknown(pointer: string, value: string, expected: string) {
  return invalidContent([{ pointer, value, expected, message: `${value} is not ${expected}.` }]);
}
