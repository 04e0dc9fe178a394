import { Link } from 'react-router-dom';
import type { Draft, Fault } from '#shared/contracts/api.generated';
import { Disclosure } from '../../../components/ui/disclosure';

const SHOWN = 20;

function lineOf(draft: Draft, fault: Fault): { key: string; name: string } | null {
  const index = /^\/lines\/(\d+)/.exec(fault.pointer ?? '')?.[1];
  const line = fault.lineKey
    ? draft.lines.find((l) => l.lineKey === fault.lineKey)
    : draft.lines[Number(index ?? -1)];
  return line ? { key: line.lineKey, name: line.name ?? line.lineKey } : null;
}

/** What still stands in the way of filing, each entry leading to the form of its line. */
export function DraftFaults({ number, draft }: { number: string; draft: Draft }) {
  const { faults } = draft;
  if (faults.length === 0) return null;
  return (
    <Disclosure
      className="mt-3 text-table"
      summary={
        faults.length === 1
          ? 'One entry stands in the way of filing'
          : `${faults.length} entries stand in the way of filing`
      }
    >
      <ul className="mt-2 grid gap-1">
        {faults.slice(0, SHOWN).map((fault, i) => {
          const line = lineOf(draft, fault);
          return (
            <li key={i}>
              {line && (
                <>
                  <Link className="link" to={`/applications/${number}/lines/${line.key}`}>
                    {line.name}
                  </Link>
                  {': '}
                </>
              )}
              {fault.message}
            </li>
          );
        })}
        {faults.length > SHOWN && <li className="text-ink-soft">{`and ${faults.length - SHOWN} more`}</li>}
      </ul>
    </Disclosure>
  );
}
