import type { ReactNode } from 'react';
import type { Application, Discrepancy } from '#shared/contracts/api.generated';
import { Disclosure } from '../../../components/ui/disclosure';
import { Sheet } from '../../../components/ui/sheet';
import { discrepanciesWords } from '../model/words';
import { DiscrepancyPart } from './discrepancy-part';
import { Thread } from './thread';

interface ToAnswerProps {
  application: Application;
  discrepancies: readonly Discrepancy[];
  attachTo: (discrepancy: number) => ReactNode;
  filesOf: (discrepancy: number) => ReactNode;
}

const isClosed = ({ state }: Discrepancy): boolean => state === 'settled' || state === 'waived';

function ClosedDiscrepancy({ discrepancy }: { discrepancy: Discrepancy }) {
  const { number, title, state, entries } = discrepancy;
  return (
    <div className="border-t border-rule px-4 py-3 text-table field:px-6">
      <Disclosure
        summary={
          <span className="text-ink">
            <b>{`D-${number}`}</b> {title} <span className="text-ink-soft">{state}</span>
          </span>
        }
      >
        <Thread entries={entries} />
      </Disclosure>
    </div>
  );
}

/** What the reviewer asks, each with its answer; what is settled stands below. */
export function ToAnswer({ application, discrepancies, attachTo, filesOf }: ToAnswerProps) {
  if (discrepancies.length === 0) return null;
  const standing = discrepancies.filter((d) => !isClosed(d));
  const closed = discrepancies.filter(isClosed);
  return (
    <Sheet
      title={application.state === 'returned' ? 'To answer' : 'Discrepancies'}
      aside={discrepanciesWords(discrepancies)}
    >
      {standing.map((discrepancy) => (
        <DiscrepancyPart
          key={discrepancy.id}
          application={application}
          discrepancy={discrepancy}
          attach={attachTo(discrepancy.number)}
          files={filesOf(discrepancy.number)}
        />
      ))}
      {closed.length > 0 && (
        <div className="sheet-cut">
          {closed.map((discrepancy) => (
            <ClosedDiscrepancy key={discrepancy.id} discrepancy={discrepancy} />
          ))}
        </div>
      )}
    </Sheet>
  );
}
