import type { Application, Discrepancy } from '#shared/contracts/api.generated';
import { GradeLabel } from '../../../components/ui/grade-mark';
import { Sheet } from '../../../components/ui/sheet';
import { turnWords } from '../model/turn-words';

interface DiscrepanciesMiniProps {
  items: readonly Discrepancy[];
  /** State of the case: it says whose turn an open one is. */
  state: Application['state'];
  /** Who has the case: "you", or the name. */
  reviewer: string;
}

const isLive = (d: Discrepancy) => d.state === 'open' || d.state === 'answered';

/** The discrepancies in brief, each leading to its thread. */
export function DiscrepanciesMini({ items, state, reviewer }: DiscrepanciesMiniProps) {
  if (items.length === 0) return null;
  const live = items.filter(isLive).length;
  return (
    <Sheet side title="Discrepancies" aside={live > 0 ? `${live} to settle` : 'all settled'}>
      <ul className="mini-list">
        {[...items].reverse().map((d) => (
          <li key={d.id}>
            <a className="link" href={`#d-${d.number}`}>
              D-{d.number}
            </a>
            <span>{d.title}</span>
            {isLive(d) ? (
              <GradeLabel grade={d.grade}>{d.state}</GradeLabel>
            ) : (
              <span className="text-ink-soft">{d.state}</span>
            )}
            <span className="mini-more">{turnWords(d, state, reviewer)}</span>
          </li>
        ))}
      </ul>
    </Sheet>
  );
}
