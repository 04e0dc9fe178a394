import type { Application } from '#shared/contracts/api.generated';
import { formatDate } from '#shared/format/dates';
import { RevisionTriangle } from '../../../components/ui/revision-triangle';
import { Sheet } from '../../../components/ui/sheet';

/** The decision with its conditions, once there is one, and what it does not replace. */
export function DecisionSheet({ application: { decision, caution } }: { application: Application }) {
  if (decision === null) return null;
  const second = decision.countersignedBy ? `, countersigned by ${decision.countersignedBy.name}` : '';
  return (
    <Sheet
      title={decision.kind === 'accepted' ? 'Accepted' : 'Declined'}
      aside={`${formatDate(decision.decidedAt)} by ${decision.decidedBy.name}${second}`}
      className="mb-6"
    >
      <div className="sheet-body grid gap-3 text-control">
        <p className="flex items-center gap-2">
          <RevisionTriangle letter={decision.revision} /> on revision {decision.revision}
        </p>
        {decision.reason && <p className="max-w-prose whitespace-pre-wrap">{decision.reason}</p>}
        {decision.conditions.length > 0 && (
          <div>
            <h3>Conditions</h3>
            <ol className="list-decimal pl-5">
              {decision.conditions.map((condition) => (
                <li key={condition}>{condition}</li>
              ))}
            </ol>
          </div>
        )}
        <p className="break-all text-label text-ink-soft">Record {decision.recordHash}</p>
        <p className="caution">{caution}</p>
      </div>
    </Sheet>
  );
}
