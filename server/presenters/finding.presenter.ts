import type { Countersign, Disposition } from '../entities/review.entities';
import type { Finding } from '../entities/verdict.entities';
import type { PeopleById } from '../repositories/people-names.repository';
import type * as Api from '../../shared/contracts/api.generated';
import type { Cause, Finding as Noticed } from '../../shared/checks/types';
import { presentPerson } from './person.presenter';

/** A finding with what became of it. */
export interface FindingView {
  finding: Finding;
  /** Carries its group's causes. */
  first: boolean;
  disposition: Disposition | null;
  /** The second reviewer's word that the disposition rests on. */
  countersign: Countersign | null;
  /** A waiver that waits for a second reviewer; reviewers alone see it. */
  proposal: Countersign | null;
  discrepancy: number | null;
}

/** What a proposed waiver is about. */
export interface WaiverProposal {
  lineKey: string;
  fingerprint: string;
  message: string;
}

/** Names that findings are shown with. */
export interface FindingNames {
  people: PeopleById;
  /** Revision id → letter. */
  letters: ReadonlyMap<string, string>;
}

/** Everybody whose name a view needs. */
export function peopleInViews(views: readonly FindingView[]): (string | null | undefined)[] {
  return views.flatMap((v) => [v.disposition?.decidedBy, v.countersign?.decidedBy, v.proposal?.proposedBy]);
}

export function stands({ finding, disposition }: FindingView): boolean {
  return disposition === null && finding.follows === null;
}

export function presentFinding(
  view: FindingView,
  names: FindingNames,
  toleranceOf: Noticed['toleranceOf'] | null = null,
): Api.Finding {
  const { finding } = view;
  const { fingerprint, code, family, grade, lineKey, circuit, section, position, parameter } = finding;
  return {
    fingerprint,
    code,
    family: family as Api.Finding['family'],
    grade,
    lineKey,
    circuit,
    // people count sections and positions from 1
    section: section === null ? null : section + 1,
    position: position === null ? null : position + 1,
    parameter,
    declared: finding.declared,
    recomputed: finding.recomputed,
    deviation: finding.deviation,
    tolerance: finding.tolerance,
    where: finding.pointer,
    message: finding.message,
    group: finding.groupNumber,
    causes: (finding.causes as Cause[]).map(presentCause),
    first: view.first,
    follows: finding.follows,
    toleranceOf: toleranceOf ?? null,
    stands: stands(view),
    disposition: presentDisposition(view, names),
    discrepancy: view.discrepancy,
  };
}

function presentCause(cause: Cause): Api.Cause {
  const { code, explains, corrected, where, residual, possible, sentence } = cause;
  return {
    code,
    in: cause.in,
    explains: [...explains],
    corrected,
    ...(where === undefined ? {} : { where }),
    residual,
    ...(possible === undefined ? {} : { possible }),
    sentence,
  };
}

function presentDisposition(view: FindingView, { people, letters }: FindingNames): Api.Disposition | null {
  const { disposition, countersign, proposal } = view;
  if (disposition !== null) {
    const { kind, revisionId, reason, decidedBy, decidedAt, carriedFrom } = disposition;
    return {
      kind,
      inForce: true,
      revision: letters.get(revisionId) ?? 'A',
      reason,
      by: presentPerson(people, decidedBy),
      at: decidedAt.toISOString(),
      countersignedBy: countersign?.decidedBy ? presentPerson(people, countersign.decidedBy) : null,
      carriedOver: carriedFrom !== null,
    };
  }
  if (proposal === null) return null;
  return {
    kind: 'waived',
    inForce: false,
    revision: letters.get(proposal.revisionId) ?? 'A',
    reason: proposal.reason,
    by: presentPerson(people, proposal.proposedBy),
    at: proposal.proposedAt.toISOString(),
    countersignedBy: null,
    carriedOver: false,
  };
}

/** Findings that still stand, by grade. */
export function countGrades(views: readonly FindingView[]): Api.Grades {
  const standing = views.filter(stands);
  const count = (grade: Finding['grade']) => standing.filter((v) => v.finding.grade === grade).length;
  return { mustAnswer: count('must-answer'), explain: count('explain'), note: count('note') };
}
