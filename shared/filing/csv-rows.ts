/** From the rows of a table to a filing: rows of one name together are a line, each row a section of it. */
import { inWords } from '../contracts/faults';
import { CellReader } from './csv-cells';
import type { CsvRow, CsvTable } from './csv-cells';
import { CSV_COLUMNS } from './csv-columns';
import { sectionFromRow } from './csv-section';
import { declaredCoupling, declaredEntries } from './csv-values';

/** Part of a filing that is still being put together. */
type Draft = Record<string, unknown>;

/** Plain fields of a line: column → field. */
const LINE_FIELDS = [
  ['name', 'name'],
  ['from', 'from'],
  ['to', 'to'],
  ['nominal_voltage_kv', 'nominalVoltageKv'],
  ['frequency_hz', 'frequencyHz'],
  ['transposed', 'transposed'],
] as const;

/** What the rows came to. */
export interface CsvFiling {
  /** The filing, perhaps faulty: it goes to `readFiling`. */
  filing: { format: 'filing/1'; lines: Draft[] };
  /** The reader, which knows the cell of every pointer, the digits as written and the faults of cells. */
  cells: CellReader;
}

/** Runs of rows with one name. */
function groups(cells: CellReader): CsvRow[][] {
  const out: CsvRow[][] = [];
  let last: string | undefined;
  for (const row of cells.table.rows) {
    const name = cells.text(row, 'name');
    const open = out.at(-1);
    if (open && name !== undefined && name === last) open.push(row);
    else out.push([row]);
    last = name;
  }
  return out;
}

/** A name that comes again after another line: its rows do not stand together. */
function scattered(cells: CellReader, lines: readonly CsvRow[][]): void {
  const seen = new Map<string, number>();
  lines.forEach((rows, i) => {
    const row = rows[0];
    const name = row && cells.text(row, 'name');
    if (!row || name === undefined) return;
    const before = seen.get(name);
    if (before === undefined) {
      seen.set(name, row.row);
      return;
    }
    const message = `Rows ${before} and ${row.row} are of the same line ${inWords(name)}; the rows of a line stand together.`;
    cells.fault(row, 'name', 'rows of one name together', message, `/lines/${i}/name`);
  });
}

/** Sections are numbered 1 to k in the order of the rows; a single one needs no number. */
function sectionNumbers(cells: CellReader, rows: readonly CsvRow[], at: string): void {
  rows.forEach((row, i) => {
    const pointer = `${at}/sections/${i}/section`;
    const number = cells.number(row, 'section', pointer);
    if (cells.told.has(pointer) || number === i + 1 || (number === undefined && rows.length === 1)) return;
    const message = `Section ${i + 1} of this line is wanted here: sections are numbered 1 to ${rows.length} in their order.`;
    cells.fault(row, 'section', String(i + 1), message);
  });
}

/** What stands once for a line may be repeated on its later rows, but not differ there. */
function repeats(cells: CellReader, rows: readonly CsvRow[]): void {
  const [first, ...later] = rows;
  if (!first) return;
  const names = CSV_COLUMNS.filter(
    (c) => c.scope === 'line' && c.name !== 'name' && cells.table.columns.has(c.name),
  );
  for (const row of later) {
    const isCable = cells.text(row, 'kind') === 'cable';
    for (const { name } of names) {
      const text = cells.text(row, name);
      // A cable's values may stand in the plain columns of its own row.
      const ofCable = isCable && /^(c2_)?[rxb][01](_unit)?$/.test(name);
      if (text === undefined || ofCable || text === cells.text(first, name)) continue;
      const expected = 'nothing, or the same as on the line’s first row';
      const message = `This stands once for the line, on row ${first.row}; here ${inWords(text)} differs from it.`;
      cells.fault(row, name, expected, message);
    }
  }
}

/** One line from its rows. */
function line(cells: CellReader, rows: readonly CsvRow[], at: string): Draft {
  const first = rows[0];
  if (!first) return {};
  const out: Draft = {};
  cells.at(at, first, 'name');
  for (const [column, field] of LINE_FIELDS) cells.put(out, field, at, first, column);
  sectionNumbers(cells, rows, at);
  repeats(cells, rows);
  out['sections'] = rows.map((row, i) => sectionFromRow(cells, row, first, `${at}/sections/${i}`));
  out['declared'] = declaredEntries(cells, first, at);
  const coupling = declaredCoupling(cells, first, at);
  if (coupling) out['declaredMutual'] = coupling;
  return out;
}

/**
 * Turns the rows of a table into a filing.
 * @param table rows by column name, without blank ones
 * @returns the filing for `readFiling`, and the reader that turns its faults into faults of cells
 */
export function filingFromRows(table: CsvTable): CsvFiling {
  const cells = new CellReader(table);
  const lines = groups(cells);
  scattered(cells, lines);
  return {
    filing: { format: 'filing/1', lines: lines.map((rows, i) => line(cells, rows, `/lines/${i}`)) },
    cells,
  };
}
