import type { Discrepancy, DiscrepancyEntry } from '../entities/review.entities';
import type { RaisedFrom } from '../repositories/discrepancy.repository';
import type { PersonName } from '../repositories/people-names.repository';
import type * as Api from '../../shared/contracts/api.generated';
import { worstGrade } from '../../shared/workflow/dispositions';
import type { FindingNames } from './finding.presenter';
import { presentPerson } from './person.presenter';

/** Names that discrepancies are shown with. */
export interface DiscrepancyNames extends FindingNames {
  owner: PersonName;
  applicant: PersonName;
  /** Writers of entries who are the owner's people. */
  ownersPeople: ReadonlySet<string>;
  /** Discrepancy id → number. */
  numbers: ReadonlyMap<string, number>;
}

export interface DiscrepancyParts {
  links: readonly RaisedFrom[];
  findings: Api.Finding[];
  entries: readonly DiscrepancyEntry[];
  attachments: Api.Attachment[];
  showsDraft: boolean;
}

export function presentDiscrepancy(
  discrepancy: Discrepancy,
  parts: DiscrepancyParts,
  names: DiscrepancyNames,
): Api.Discrepancy {
  const { people, letters } = names;
  return {
    id: discrepancy.id,
    number: discrepancy.number,
    state: discrepancy.state,
    version: discrepancy.version,
    title: discrepancy.title,
    grade: worstGrade(parts.links.map((link) => link.grade)) ?? 'note',
    question: discrepancy.questioned,
    wanted: discrepancy.wouldSettle,
    raisedOn: letters.get(discrepancy.raisedOnRevisionId) ?? 'A',
    raisedAt: discrepancy.raisedAt.toISOString(),
    raisedBy: presentPerson(people, discrepancy.raisedBy),
    lineKeys: discrepancy.lineKeys,
    findings: parts.findings,
    answeredBy: discrepancy.answeredBy,
    draftAnswer: parts.showsDraft ? discrepancy.draftAnswer : null,
    entries: parts.entries.map((entry) => presentEntry(entry, names)),
    attachments: parts.attachments,
  };
}

function presentEntry(entry: DiscrepancyEntry, names: DiscrepancyNames): Api.DiscrepancyEntry {
  const { people, letters, owner, applicant, ownersPeople } = names;
  return {
    id: entry.id,
    kind: entry.kind,
    revision: letters.get(entry.revisionId ?? '') ?? 'A',
    by: presentPerson(people, entry.writtenBy),
    party: ownersPeople.has(entry.writtenBy) ? owner : applicant,
    at: entry.writtenAt.toISOString(),
    text: entry.text,
  };
}
