import type { AuditEvent } from '../../entities/record.entities';
import type { Discrepancy } from '../../entities/review.entities';
import { asSystem } from '../../database/transaction';
import { gridOwner, membersAmong, organisationNames } from '../../repositories/people-names.repository';
import { eventsOf } from '../../repositories/timeline.repository';
import type * as Api from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { readCase } from '../cases/case-file';
import { visibleDiscrepancies } from '../discrepancies/visible-discrepancies';
import { eventSentence } from './event-sentences';

const LIMIT = 2000;

/** Acts that reviewers have among themselves. */
const AMONG_REVIEWERS = /^(waiver\.|decline\.|countersign\.|finding\.|check\.(asked|adopted)|note\.)/;

/** Work on a draft, which is the applicant's own until it is filed. */
const AMONG_APPLICANTS = /^(line\.|lines\.|application\.(created|updated)$)/;

/** Steps whose reason is for the owner's people: why a case changes hands is not the applicant's business. */
const REASON_AMONG_REVIEWERS = /^application\.(handed-over|put-back)$/;

/** What happened to an application, oldest first. */
export async function getTimeline(caller: Caller, reference: string): Promise<Api.Timeline> {
  const { tx } = caller;
  const { application } = await readCase(caller, reference);
  const events = await eventsOf(tx.manager, application.id, LIMIT + 1);
  const shown = await shownTo(caller, application.id, events);
  const owner = await gridOwner(tx.manager);
  const actors = events.flatMap((event) => event.actorId ?? []);
  const ownersPeople = await asSystem(tx, (manager) => membersAmong(manager, owner.id, actors));
  const applicant = (await organisationNames(tx.manager, [application.orgId])).get(application.orgId);
  return {
    items: shown
      .slice(0, LIMIT)
      .map((event) =>
        presentEvent(event, ownersPeople.has(event.actorId ?? '') ? owner : (applicant ?? owner)),
      ),
    limitReached: events.length > LIMIT,
  };
}

async function shownTo(
  caller: Caller,
  applicationId: string,
  events: readonly AuditEvent[],
): Promise<AuditEvent[]> {
  if (caller.actor.role !== 'applicant') return events.filter((event) => !AMONG_APPLICANTS.test(event.act));
  const sent = await visibleDiscrepancies(caller, applicationId);
  return events
    .filter((event) => isForApplicants(event, events, sent))
    .map((event) => (REASON_AMONG_REVIEWERS.test(event.act) ? withoutReason(event) : event));
}

/** A discrepancy reaches the applicant with a letter, and so does all that is done with it, or hangs on it. */
function isForApplicants(
  event: AuditEvent,
  events: readonly AuditEvent[],
  sent: readonly Pick<Discrepancy, 'id' | 'number'>[],
): boolean {
  const { act, seq } = event;
  const { number, discrepancyId } = (event.after ?? {}) as { number?: unknown; discrepancyId?: unknown };
  if (AMONG_REVIEWERS.test(act)) return false;
  if (typeof discrepancyId === 'string') return sent.some((d) => d.id === discrepancyId);
  if (!act.startsWith('discrepancy.')) return true;
  if (!sent.some((d) => d.number === number)) return false;
  // what is asked again waits for the next letter
  return act !== 'discrepancy.reopened' || events.some((later) => isReturn(later) && isAfter(later, seq));
}

const isReturn = ({ act }: AuditEvent) => act === 'application.returned';
const isAfter = (event: AuditEvent, seq: string) => BigInt(event.seq) > BigInt(seq);

function withoutReason(event: AuditEvent): AuditEvent {
  return { ...event, after: { ...(event.after as object), reason: undefined } };
}

function presentEvent(event: AuditEvent, party: Api.Party): Api.TimelineEvent {
  const after = (event.after ?? {}) as Record<string, unknown>;
  const letter = after['revision'];
  return {
    seq: Number(event.seq),
    at: event.at.toISOString(),
    act: event.act,
    actor: event.actorId === null ? null : { id: event.actorId, name: event.actorName },
    party: event.actorId === null ? null : party,
    sentence: eventSentence(event.act, event.actorName, after).slice(0, 600),
    revision: typeof letter === 'string' ? letter : null,
    hash: event.hash,
  };
}
