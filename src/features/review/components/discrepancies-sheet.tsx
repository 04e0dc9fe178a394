import type { Discrepancy } from '#shared/contracts/api.generated';
import { Button } from '../../../components/ui/button';
import { DiscrepancyThread, type ThreadContext } from './discrepancy-thread';

interface DiscrepanciesSheetProps {
  discrepancies: readonly Discrepancy[];
  context: ThreadContext;
  /** Raises one by hand; null where it may not be. */
  onRaise: (() => void) | null;
}

const RANK: Readonly<Record<Discrepancy['state'], number>> = { answered: 0, open: 1, settled: 2, waived: 2 };

/** All discrepancies of the case: those that want something first, the closed ones folded below. */
export function DiscrepanciesSheet({ discrepancies, context, onRaise }: DiscrepanciesSheetProps) {
  const sorted = [...discrepancies].sort((a, b) => RANK[a.state] - RANK[b.state] || b.number - a.number);
  if (sorted.length === 0 && onRaise === null) return null;
  return (
    <section className="sheet mt-6" aria-label="Threads of the discrepancies" id="discrepancies">
      {sorted.map((discrepancy) => (
        <DiscrepancyThread key={discrepancy.id} discrepancy={discrepancy} context={context} />
      ))}
      {onRaise && (
        <div className="sheet-foot items-center">
          <span className="text-ink-soft">
            {sorted.length === 0
              ? 'No discrepancy yet. Raise one from a finding above, or by hand.'
              : 'What no finding shows can be raised by hand.'}
          </span>
          <Button small onClick={onRaise}>
            Raise by hand
          </Button>
        </div>
      )}
    </section>
  );
}
