import type { Fault } from '#shared/contracts/api.generated';

const SHOWN = 3;

function placeOf({ row, column, pointer }: Fault): string {
  if (row !== undefined) return column ? `Row ${row}, ${column}` : `Row ${row}`;
  return pointer ?? 'The file';
}

/** The first faults of a file of which nothing can be taken: they are all that there is to say of it. */
export function FirstFaults({ faults }: { faults: readonly Fault[] }) {
  return (
    <ul className="grid gap-1.5" aria-label="The first places to look at">
      {faults.slice(0, SHOWN).map((fault, i) => (
        <li key={i} className="border-l-2 border-vermilion pl-2.5 [overflow-wrap:anywhere]">
          <span className="block font-mono text-label text-ink-soft">{placeOf(fault)}</span>
          {fault.message}
        </li>
      ))}
    </ul>
  );
}
