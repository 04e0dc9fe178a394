/** A CSV file as rows by column name, with the dialect that was found and every fault of its form. */
import Papa from 'papaparse';
import { shown } from '../../shared/contracts/faults';
import type { CellFault } from '../../shared/contracts/faults';
import type { CsvRow, CsvTable } from '../../shared/filing/csv-cells';
import { csvColumn } from '../../shared/filing/csv-columns';
import { readHeader } from './csv-header';
import type { CsvHeader } from './csv-header';
import type { Encoding } from './decode-text';
import { decimalOf, delimiterOf, DELIMITERS, firstLine, lineEndsOf, normalised } from './sniff-dialect';
import type { CorrectedDialect, Delimiter, Dialect } from './sniff-dialect';

/** Most fields in a row: the list of columns has fewer than half as many. */
const MAX_FIELDS = 1000;

/** Longest line of text: a row of all columns has some thousands of characters. */
const MAX_LINE = 200_000;

export interface CsvOptions {
  /** Most data rows. */
  maxRows: number;
  /** What somebody corrected of the dialect. */
  told?: CorrectedDialect;
}

export interface CsvFile {
  table: CsvTable;
  dialect: Dialect;
  /** Data rows, blank ones not counted. */
  rowCount: number;
  faults: CellFault[];
  /** Names of lines with a row that could not be read: nothing more can be said of them. */
  broken: ReadonlySet<string>;
}

const whole = (row: number, expected: string, message: string): CellFault => ({
  row,
  column: '',
  value: null,
  expected,
  message,
});

/** Records that are parsed: data rows, and about as many blank ones. */
const mostRecords = (maxRows: number) => 2 * maxRows + 1000;

/** Number of the first line that is too long among those that will be parsed; null when there is none. */
function endlessLine(text: string, lines: number): number | null {
  let start = 0;
  for (let n = 1; n <= lines && start < text.length; n++) {
    const found = text.indexOf('\n', start);
    const end = found < 0 ? text.length : found;
    if (end - start > MAX_LINE) return n;
    start = end + 1;
  }
  return null;
}

interface Parsed {
  records: string[][];
  fault: CellFault | null;
}

/** Parses with everything fixed beforehand; an error of the parser ends it, since what follows it is out of joint. */
function parse(text: string, delimiter: Delimiter, maxRows: number): Parsed {
  const most = mostRecords(maxRows);
  const { data, errors, meta } = Papa.parse<string[]>(text, {
    delimiter: DELIMITERS[delimiter],
    newline: '\n',
    quoteChar: '"',
    header: false,
    dynamicTyping: false,
    skipEmptyLines: false,
    preview: most,
  });
  const error = errors[0];
  if (error) {
    const row = (error.row ?? 0) + 1;
    const what =
      error.code === 'MissingQuotes'
        ? 'a quote (") is opened and not closed'
        : 'a quote (") stands where a field should end';
    return { records: [], fault: whole(row, 'fields whose quotes are closed', `Row ${row}: ${what}.`) };
  }
  if (meta.truncated && data.length >= most) {
    const message = `The file has more than ${maxRows} rows, or as many blank ones.`;
    return { records: [], fault: whole(most, `at most ${maxRows} rows`, message) };
  }
  return { records: data, fault: null };
}

const isBlank = (fields: readonly string[]) => fields.every((f) => f.trim() === '');

function raggedFault(fields: readonly string[], width: number, row: number, delimiter: Delimiter): CellFault {
  const hint =
    fields.length > width && delimiter === 'comma'
      ? ' A decimal comma? Write a point, or part the fields by semicolons.'
      : '';
  return {
    ...whole(
      row,
      `${width} fields`,
      `Row ${row} has ${fields.length} fields, the header has ${width}.${hint}`,
    ),
    value: shown(fields.join(DELIMITERS[delimiter])),
  };
}

interface Body {
  rows: { row: number; cells: Map<string, string> }[];
  faults: CellFault[];
  broken: Set<string>;
  count: number;
}

function readBody(records: readonly string[][], header: CsvHeader, delimiter: Delimiter): Body {
  const body: Body = { rows: [], faults: [], broken: new Set(), count: 0 };
  const nameAt = header.names.indexOf('name');
  records.slice(1).forEach((fields, i) => {
    if (isBlank(fields)) return;
    body.count += 1;
    const row = i + 2;
    const surplus = fields.slice(header.width);
    if (fields.length < header.width || !isBlank(surplus)) {
      body.faults.push(raggedFault(fields, header.width, row, delimiter));
      body.broken.add(fields[nameAt]?.trim() ?? '');
      return;
    }
    const cells = new Map<string, string>();
    header.names.forEach((name, at) => name !== null && cells.set(name, fields[at] ?? ''));
    body.rows.push({ row, cells });
  });
  return body;
}

function* numberCells(rows: readonly CsvRow[]): Iterable<string> {
  for (const { cells } of rows)
    for (const [name, text] of cells) if (csvColumn(name)?.kind === 'number') yield text;
}

/**
 * Reads the text of a CSV file.
 * @param raw decoded text, with whatever line ends it has
 * @param encoding the encoding that it was decoded from
 */
export function readCsv(raw: string, encoding: Encoding, { maxRows, told = {} }: CsvOptions): CsvFile {
  const { text, sep } = normalised(raw);
  const delimiter = told.delimiter ?? delimiterOf(text, sep);
  const dialect: Dialect = { delimiter, decimal: 'point', encoding, lineEnds: lineEndsOf(raw) };
  const nothing = (fault: CellFault): CsvFile => ({
    table: { columns: new Set(), rows: [], decimal: 'point' },
    dialect,
    rowCount: 0,
    faults: [fault],
    broken: new Set(),
  });
  if (text.trim() === '') return nothing(whole(1, 'a header and rows', 'The file is empty.'));
  if (firstLine(text).split(DELIMITERS[delimiter]).length > MAX_FIELDS)
    return nothing(
      whole(1, `at most ${MAX_FIELDS} columns`, `The header has more than ${MAX_FIELDS} columns.`),
    );
  const endless = endlessLine(text, mostRecords(maxRows));
  if (endless !== null) {
    const expected = `rows of at most ${MAX_LINE} characters`;
    return nothing(whole(endless, expected, `Row ${endless} is longer than ${MAX_LINE} characters.`));
  }
  const parsed = parse(text, delimiter, maxRows);
  if (parsed.fault) return nothing(parsed.fault);
  const header = readHeader(parsed.records[0] ?? []);
  const body = readBody(parsed.records, header, delimiter);
  const faults = [...header.faults, ...body.faults];
  if (body.count === 0) faults.push(whole(2, 'at least one row', 'The file has no data rows.'));
  if (body.count > maxRows)
    faults.push(
      whole(
        maxRows + 2,
        `at most ${maxRows} rows`,
        `The file has ${body.count} rows; at most ${maxRows} are taken.`,
      ),
    );
  dialect.decimal = told.decimal ?? decimalOf(delimiter, numberCells(body.rows));
  const columns = new Set(header.names.filter((n): n is string => n !== null));
  const rows =
    body.count > maxRows ? [] : body.rows.filter((r) => !body.broken.has(r.cells.get('name')?.trim() ?? ''));
  return {
    table: { columns, rows, decimal: dialect.decimal },
    dialect,
    rowCount: body.count,
    faults,
    broken: body.broken,
  };
}
