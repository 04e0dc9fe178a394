/** The header row of a lines' CSV file: which column is where, and what is wrong with it. */
import { inWords, shown } from '../../shared/contracts/faults';
import type { CellFault } from '../../shared/contracts/faults';
import { didYouMean } from '../../shared/contracts/nearest';
import { csvColumn, CSV_NAMES, CSV_REQUIRED } from '../../shared/filing/csv-columns';

export interface CsvHeader {
  /** Column name of each field of a row; null for a field that is not read. */
  names: (string | null)[];
  /** Fields that the header has, blank ones at its end not counted. */
  width: number;
  faults: CellFault[];
}

function fault(text: string, expected: string, message: string): CellFault {
  const cut = String(shown(text) ?? '');
  return { row: 1, column: cut, value: cut === '' ? null : cut, expected, message };
}

function unknown(text: string): CellFault {
  const hint = didYouMean(text.slice(0, 60), CSV_NAMES);
  return fault(text, 'a column of the list', `Column ${inWords(text)} is not known.${hint}`);
}

/** Columns that are asked for: where circuit 1 is declared or nothing is, its values. */
function missing(names: ReadonlySet<string | null>): CellFault[] {
  const plain = names.has('c2_r1') && !names.has('r1');
  const values = (plain ? ['c2_r1', 'c2_x1', 'c2_b1'] : ['r1', 'x1', 'b1']) as readonly string[];
  return [...CSV_REQUIRED, ...values]
    .filter((name) => !names.has(name))
    .map((name) => ({
      row: 1,
      column: name,
      value: null,
      expected: `a column ${name}`,
      message: `Column ${name} is missing.`,
    }));
}

/** Reads the header's fields. Faulty columns are told and left out; the others are still read. */
export function readHeader(fields: readonly string[]): CsvHeader {
  const texts = fields.map((f) => f.trim());
  let width = texts.length;
  while (width > 0 && texts[width - 1] === '') width -= 1;
  const faults: CellFault[] = [];
  const first = new Map<string, number>();
  const names = texts.slice(0, width).map((text, i): string | null => {
    const column = csvColumn(text);
    if (!column) {
      const empty = `Column ${i + 1} has no name.`;
      faults.push(text === '' ? { ...fault(text, 'a name', empty), column: `(${i + 1})` } : unknown(text));
      return null;
    }
    const before = first.get(column.name);
    if (before === undefined) {
      first.set(column.name, i);
      return column.name;
    }
    const message = `Column ${text} is there twice (columns ${before + 1} and ${i + 1}).`;
    faults.push(fault(text, 'each column once', message));
    return null;
  });
  return { names, width, faults: [...faults, ...missing(new Set(names))] };
}
