import type { AuditEvent } from '../../entities/record.entities';
import { asSystem } from '../../database/transaction';
import { gridOwner, membersAmong, organisationNames } from '../../repositories/people-names.repository';
import { eventsOf } from '../../repositories/timeline.repository';
import type * as Api from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { readCase } from '../cases/case-file';
import { eventSentence } from './event-sentences';

const LIMIT = 2000;

/** Acts that reviewers have among themselves. */
const AMONG_REVIEWERS = /^(waiver\.|decline\.|countersign\.|finding\.|check\.(asked|adopted)|note\.)/;

/** Work on a draft, which is the applicant's own until it is filed. */
const AMONG_APPLICANTS = /^(line\.|lines\.|application\.(created|updated)$)/;

/** What happened to an application, oldest first. */
export async function getTimeline(caller: Caller, reference: string): Promise<Api.Timeline> {
  const { tx, actor } = caller;
  const { application } = await readCase(caller, reference);
  const events = await eventsOf(tx.manager, application.id, LIMIT + 1);
  const shown = events
    .slice(0, LIMIT)
    .filter((event) =>
      actor.role === 'applicant' ? isForApplicants(event, events) : !AMONG_APPLICANTS.test(event.act),
    );
  const owner = await gridOwner(tx.manager);
  const actors = events.flatMap((event) => event.actorId ?? []);
  const ownersPeople = await asSystem(tx, (manager) => membersAmong(manager, owner.id, actors));
  const applicant = (await organisationNames(tx.manager, [application.orgId])).get(application.orgId);
  return {
    items: shown.map((event) =>
      presentEvent(event, ownersPeople.has(event.actorId ?? '') ? owner : (applicant ?? owner)),
    ),
    limitReached: events.length > LIMIT,
  };
}

/** What is raised or asked again reaches the applicant with the next letter. */
function isForApplicants(event: AuditEvent, events: readonly AuditEvent[]): boolean {
  if (AMONG_REVIEWERS.test(event.act)) return false;
  if (!/^discrepancy\.(raised|reopened)$/.test(event.act)) return true;
  return events.some(
    (later) => later.act === 'application.returned' && BigInt(later.seq) > BigInt(event.seq),
  );
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
