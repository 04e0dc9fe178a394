import type { Countersign } from '../entities/review.entities';
import type { CountersignPlace } from '../repositories/disposition.repository';
import type { PeopleById } from '../repositories/people-names.repository';
import type * as Api from '../../shared/contracts/api.generated';
import type { WaiverProposal } from './finding.presenter';
import { instantOrNull, presentPerson, presentPersonOrNull } from './person.presenter';

export function presentCountersign(
  countersign: Countersign,
  place: CountersignPlace,
  people: PeopleById,
): Api.Countersign {
  const proposal = countersign.subject === 'waive' ? (countersign.proposal as WaiverProposal) : null;
  const lapsed = countersign.outcome === 'pending' && !place.current;
  return {
    id: countersign.id,
    applicationId: countersign.applicationId,
    number: place.number,
    subject: countersign.subject,
    revision: place.letter,
    fingerprint: proposal?.fingerprint ?? null,
    finding: proposal?.message ?? null,
    reason: countersign.reason,
    proposedBy: presentPerson(people, countersign.proposedBy),
    proposedAt: countersign.proposedAt.toISOString(),
    outcome: lapsed ? 'lapsed' : countersign.outcome,
    decidedBy: presentPersonOrNull(people, countersign.decidedBy),
    decidedAt: instantOrNull(countersign.decidedAt),
    remark: countersign.remark,
  };
}
