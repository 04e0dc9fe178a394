/** How a CSV file is written: found by looking, never by guessing at the data. */
import { csvColumn } from '../../shared/filing/csv-columns';
import type { DecimalSign } from '../../shared/units/number-text';
import type { Encoding } from './decode-text';

export type Delimiter = 'comma' | 'semicolon' | 'tab';
export type LineEnds = 'crlf' | 'lf' | 'cr' | 'mixed';

/** What was found, as it is shown for confirmation. */
export interface Dialect {
  delimiter: Delimiter;
  decimal: DecimalSign;
  encoding: Encoding;
  lineEnds: LineEnds;
}

/** What somebody says of a dialect against what was found; line ends are taken as they come. */
export type CorrectedDialect = Partial<Omit<Dialect, 'lineEnds'>>;

export const DELIMITERS: Readonly<Record<Delimiter, string>> = { comma: ',', semicolon: ';', tab: '\t' };

/** Which line ends a text has. A text of one line counts as LF. */
export function lineEndsOf(text: string): LineEnds {
  const crlf = text.includes('\r\n');
  const cr = /\r(?!\n)/.test(text);
  const lf = /(?<!\r)\n/.test(text);
  if (Number(crlf) + Number(cr) + Number(lf) > 1) return 'mixed';
  return crlf ? 'crlf' : cr ? 'cr' : 'lf';
}

/** The text with LF only, and its first line when that is a spreadsheet's `sep=;`. */
export function normalised(text: string): { text: string; sep: string | null } {
  const lf = text.replace(/\r\n?/g, '\n');
  const m = /^sep=(.)\n/.exec(lf);
  return m ? { text: lf.slice(m[0].length), sep: m[1] ?? null } : { text: lf, sep: null };
}

/** The text up to its first line end, as far as a header can reach. */
export function firstLine(text: string): string {
  const start = text.slice(0, 200_000);
  const end = start.indexOf('\n');
  return end < 0 ? start : start.slice(0, end);
}

/** The delimiter that cuts the header into the most columns that are known; comma when none does. */
export function delimiterOf(text: string, sep: string | null): Delimiter {
  const names = Object.keys(DELIMITERS) as Delimiter[];
  const told = names.find((n) => DELIMITERS[n] === sep);
  if (told) return told;
  const header = firstLine(text);
  const known = (n: Delimiter) =>
    header.split(DELIMITERS[n]).filter((h) => csvColumn(h.trim().replaceAll('"', ''))).length;
  const cuts = (n: Delimiter) => header.split(DELIMITERS[n]).length;
  return names.reduce((best, n) => {
    const better = known(n) - known(best) || cuts(n) - cuts(best);
    return better > 0 ? n : best;
  });
}

/**
 * The decimal sign of the cells in columns of numbers. A comma can only be one where it does not part the cells.
 * @param cells texts of the cells that ought to be numbers
 */
export function decimalOf(delimiter: Delimiter, cells: Iterable<string>): DecimalSign {
  if (delimiter === 'comma') return 'point';
  let commas = 0;
  let points = 0;
  for (const cell of cells) {
    if (/^\s*-?\d+,\d+([eE][+-]?\d+)?\s*$/.test(cell)) commas += 1;
    else if (/^\s*-?\d+\.\d+([eE][+-]?\d+)?\s*$/.test(cell)) points += 1;
  }
  return commas > points ? 'comma' : 'point';
}
