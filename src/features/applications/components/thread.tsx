import type { DiscrepancyEntry } from '#shared/contracts/api.generated';
import { formatInstant } from '#shared/format/dates';
import { RevisionTriangle } from '../../../components/ui/revision-triangle';

/** What was written on a discrepancy, ruled like a revision table. */
export function Thread({ entries }: { entries: readonly DiscrepancyEntry[] }) {
  return (
    <ol className="thread -mx-4 mt-3 field:-mx-6">
      {entries.map((entry) => (
        <li key={entry.id}>
          <RevisionTriangle letter={entry.revision} older />
          <div className="thread-who">
            <b>{entry.by.name}</b>
            <span>{entry.party.name}</span>
            <span>{formatInstant(entry.at)}</span>
          </div>
          <div className="thread-words">{entry.text}</div>
        </li>
      ))}
    </ol>
  );
}
