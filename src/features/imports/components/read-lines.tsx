import type { Import } from '#shared/contracts/api.generated';
import { Disclosure } from '../../../components/ui/disclosure';
import { plainQuantity } from '../../../lib/plain-number';

type ReadLine = Import['lines'][number];

const SHOWN = 8;

/** Each line that can be taken, before it is: name, voltage, length, circuits, and whether it replaces another. */
export function ReadLines({ lines }: { lines: readonly ReadLine[] }) {
  const rest = lines.slice(SHOWN);
  return (
    <div>
      <LineList lines={lines.slice(0, SHOWN)} label="Lines that can be taken" />
      {rest.length > 0 && (
        <Disclosure summary={rest.length === 1 ? '1 more line' : `${rest.length} more lines`}>
          <LineList lines={rest} label="More lines that can be taken" />
        </Disclosure>
      )}
    </div>
  );
}

function LineList({ lines, label }: { lines: readonly ReadLine[]; label: string }) {
  return (
    <ul aria-label={label}>
      {lines.map((line, i) => (
        <li key={i} className="border-t border-rule py-1.5">
          <span className="block [overflow-wrap:anywhere]">{line.name}</span>
          <span className="text-ink-soft">{figuresOf(line)}</span>
          {line.replaces && (
            <span className="block font-semibold text-copper">
              {`Takes the place of ${line.lineKey ?? 'the line of this name'} in the draft`}
            </span>
          )}
        </li>
      ))}
    </ul>
  );
}

function figuresOf({ nominalVoltageKv, lengthKm, circuitCount }: ReadLine): string {
  return [
    ...(nominalVoltageKv === null ? [] : [plainQuantity(nominalVoltageKv, 'kV')]),
    ...(lengthKm === null ? [] : [plainQuantity(lengthKm, 'km')]),
    circuitCount === 2 ? 'double circuit' : 'single circuit',
  ].join(', ');
}
