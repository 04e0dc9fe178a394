import type { Import } from '#shared/contracts/api.generated';

type Dialect = NonNullable<Import['dialect']>;

const DELIMITERS: Readonly<Record<Dialect['delimiter'], string>> = {
  comma: 'commas',
  semicolon: 'semicolons',
  tab: 'tabs',
};
const ENCODINGS: Readonly<Record<Dialect['encoding'], string>> = {
  'utf-8': 'UTF-8',
  'windows-1252': 'Windows-1252',
};

/** How the applicant says that a table is written. */
export type Correction = Pick<Dialect, 'delimiter' | 'decimal' | 'encoding'>;

/** What can be corrected, with what it can be. */
export const CHOICES: readonly {
  name: keyof Correction;
  label: string;
  options: readonly { value: string; label: string }[];
}[] = [
  {
    name: 'delimiter',
    label: 'Columns are parted by',
    options: Object.entries(DELIMITERS).map(([value, label]) => ({ value, label })),
  },
  {
    name: 'decimal',
    label: 'Decimal sign',
    options: [
      { value: 'point', label: 'point' },
      { value: 'comma', label: 'comma' },
    ],
  },
  {
    name: 'encoding',
    label: 'Encoding',
    options: Object.entries(ENCODINGS).map(([value, label]) => ({ value, label })),
  },
];

/** How a table is written, as it was found: "Columns parted by semicolons, decimal comma, UTF-8". */
export function dialectWords({ delimiter, decimal, encoding, lineEnds }: Dialect): string {
  const ends = lineEnds === 'mixed' ? ', mixed line ends' : '';
  return `Columns parted by ${DELIMITERS[delimiter]}, decimal ${decimal}, ${ENCODINGS[encoding]}${ends}`;
}

const counted = (n: number, one: string): string => `${n} ${one}${n === 1 ? '' : 's'}`;

/** Why the draft cannot be saved as a file: the lines that are not complete; null when it can. */
export function exportBlockedBy(incomplete: readonly string[]): string | null {
  const [first] = incomplete;
  if (first === undefined) return null;
  if (incomplete.length > 3)
    return `The draft can be saved as a file once its ${incomplete.length} incomplete lines are complete.`;
  const last = incomplete.at(-1) ?? first;
  const names = incomplete.length === 1 ? first : `${incomplete.slice(0, -1).join(', ')} and ${last}`;
  return `The draft can be saved as a file once ${names} ${incomplete.length === 1 ? 'is' : 'are'} complete.`;
}

/** What was read, in one sentence. */
export function readWords({ format, rowCount, lines, faults }: Import): string {
  const rows = format === 'csv' ? `${counted(rowCount, 'row')} read: ` : '';
  const taken = `${counted(lines.length, 'line')} can be taken`;
  return faults.length === 0
    ? `${rows}${taken}.`
    : `${rows}${taken}, ${counted(faults.length, 'place')} to look at.`;
}
