import { formatInstant } from '#shared/format/dates';
import { PageHead } from '../../../components/ui/page-head';
import { RevisionTriangle } from '../../../components/ui/revision-triangle';
import { Sheet } from '../../../components/ui/sheet';
import type { Role } from '../../../lib/api/session';
import { applicationPath } from '../../../lib/paths';
import { useTimeline } from '../../../lib/queries/get-timeline';

/** Everything that happened to an application, oldest first, each entry chained to the one before. */
export function CaseRecord({ number, role }: { number: string; role: Role }) {
  const { items, limitReached } = useTimeline(number);
  const current = items.findLast((event) => event.revision !== null)?.revision;
  return (
    <>
      <PageHead
        title={`Record of ${number}`}
        crumbs={[{ label: number, to: applicationPath(role, number) }, { label: 'Record' }]}
        lead="Everything that happened to this application. Entries are only ever added; each carries a hash over the one before."
      />
      <Sheet main label="Record">
        <ol className="thread border-t-0">
          {items.map((event) => (
            <li key={event.seq}>
              {event.revision ? (
                <RevisionTriangle letter={event.revision} older={event.revision !== current} />
              ) : (
                <span />
              )}
              <div className="thread-who">
                <b>{event.actor?.name ?? 'Counterpoise'}</b>
                {event.party && <span>{event.party.name}</span>}
                <span>{formatInstant(event.at)}</span>
              </div>
              <div className="thread-words">
                {event.sentence}
                <p className="break-all font-mono text-axis text-ink-soft">
                  {event.seq} · {event.hash.slice(0, 16)}
                </p>
              </div>
            </li>
          ))}
        </ol>
        {limitReached && <p className="sheet-foot">More happened than is listed: the limit is reached.</p>}
      </Sheet>
    </>
  );
}
