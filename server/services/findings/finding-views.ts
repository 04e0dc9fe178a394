import type { Revision } from '../../entities/filed.entities';
import type { Countersign, Disposition } from '../../entities/review.entities';
import type { Finding } from '../../entities/verdict.entities';
import {
  countersignsByIds,
  pendingCountersigns,
  standingDispositions,
} from '../../repositories/disposition.repository';
import { raisedFrom, type RaisedFrom } from '../../repositories/discrepancy.repository';
import { findingsOfRun } from '../../repositories/run.repository';
import type { FindingView, WaiverProposal } from '../../presenters/finding.presenter';
import type { Caller } from '../cases/caller';
import { visibleDiscrepancies } from '../discrepancies/visible-discrepancies';

/** What names a matter from revision to revision: the line, the code, and the place; not the figures. */
export function matterKey(finding: {
  lineKey: string;
  code: string;
  circuit: number | null;
  section: number | null;
  position: number | null;
}): string {
  const { lineKey, code, circuit, section, position } = finding;
  return [lineKey, code, circuit, section, position].join(' ');
}

const figureKey = (row: { lineKey: string; fingerprint: string }) => `${row.lineKey} ${row.fingerprint}`;

/** Findings of a run with what became of each: dispositions, proposals, discrepancies. */
export async function findingViews(
  caller: Caller,
  revision: Revision,
  runId: string,
  lineKey?: string,
): Promise<FindingView[]> {
  const { manager } = caller.tx;
  const findings = await findingsOfRun(manager, runId, lineKey);
  if (findings.length === 0) return [];
  const dispositions = await standingDispositions(manager, revision.id);
  const countersigns = await countersignsByIds(
    manager,
    dispositions.flatMap((d) => d.countersignId ?? []),
  );
  const proposals = caller.actor.role === 'applicant' ? [] : await pendingCountersigns(manager, revision.id);
  const numbers = await discrepancyNumbers(caller, revision.applicationId);
  return viewsOf(findings, dispositions, countersigns, proposals, numbers);
}

function viewsOf(
  findings: readonly Finding[],
  dispositions: readonly Disposition[],
  countersigns: ReadonlyMap<string, Countersign>,
  proposals: readonly Countersign[],
  numbers: ReadonlyMap<string, number>,
): FindingView[] {
  const done = new Map(dispositions.map((d) => [figureKey(d), d]));
  const proposed = new Map(
    proposals
      .filter((p) => p.subject === 'waive')
      .map((p) => [figureKey(p.proposal as WaiverProposal), p] as const),
  );
  const groups = new Set<string>();
  return findings.map((finding) => {
    const group = `${finding.lineKey} ${finding.circuit} ${finding.groupNumber}`;
    const first = finding.groupNumber === null || !groups.has(group);
    groups.add(group);
    const disposition = done.get(figureKey(finding)) ?? null;
    return {
      finding,
      first,
      disposition,
      countersign: countersigns.get(disposition?.countersignId ?? '') ?? null,
      proposal: proposed.get(figureKey(finding)) ?? null,
      discrepancy: numbers.get(matterKey(finding)) ?? null,
    };
  });
}

/** Number of the latest discrepancy about each matter, as far as the caller may know of it. */
async function discrepancyNumbers(caller: Caller, applicationId: string): Promise<Map<string, number>> {
  const discrepancies = await visibleDiscrepancies(caller, applicationId);
  const numbers = new Map(discrepancies.map((d) => [d.id, d.number]));
  const links = await raisedFrom(caller.tx.manager, [...numbers.keys()]);
  const byMatter = new Map<string, number>();
  for (const link of links) {
    const number = numbers.get(link.discrepancyId) ?? 0;
    const key = matterKey(link);
    if (number > (byMatter.get(key) ?? 0)) byMatter.set(key, number);
  }
  return byMatter;
}

/** The findings of a run that discrepancies were raised about: same line, code and place. */
export function findingsAbout(links: readonly RaisedFrom[], findings: readonly Finding[]): Finding[] {
  const matters = new Set(links.map(matterKey));
  return findings.filter((finding) => matters.has(matterKey(finding)));
}
