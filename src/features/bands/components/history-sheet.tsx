import type { RuleSetSummary } from '#shared/contracts/api.generated';
import { formatDate } from '#shared/format/dates';
import { Sheet } from '../../../components/ui/sheet';

/** The rule sets that were published, newest first, each with its reason. */
export function HistorySheet({ sets }: { sets: readonly RuleSetSummary[] }) {
  const published = sets.filter((set) => set.status === 'published').sort((a, b) => b.version - a.version);
  return (
    <Sheet side title="Published" aside={published.length}>
      <ul className="mini-list">
        {published.map((set) => (
          <li key={set.version}>
            <b className="font-semibold">{set.version}</b>
            <span>{set.effectiveFrom ? formatDate(set.effectiveFrom) : ''}</span>
            <span className="text-ink-soft">{set.inForce ? 'in force' : ''}</span>
            <span className="mini-more">
              {set.reason}
              {set.publishedBy && ` (${set.publishedBy.name})`}
            </span>
          </li>
        ))}
      </ul>
    </Sheet>
  );
}
