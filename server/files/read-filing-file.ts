/** A file of lines, JSON or CSV, as a filing; or every fault of it at once. Used by the import and by the command. */
import { inOrder, MAX_FAULTS, shown } from '../../shared/contracts/faults';
import type { CellFault, Fault } from '../../shared/contracts/faults';
import { readJsonText } from '../../shared/contracts/json-text';
import type { CellReader } from '../../shared/filing/csv-cells';
import { CSV_NAMES } from '../../shared/filing/csv-columns';
import { filingFromRows } from '../../shared/filing/csv-rows';
import { readFiling } from '../../shared/filing/read-filing';
import type { ReadContext } from '../../shared/filing/read-filing';
import type { NormalisedFiling, NormalisedLine, Notice } from '../../shared/filing/types';
import { decodeText } from './decode-text';
import type { Encoding } from './decode-text';
import { readCsv } from './read-csv';
import type { CorrectedDialect, Dialect } from './sniff-dialect';

/** Largest file that is read, in bytes. */
export const MAX_FILE_BYTES = 25 * 1024 * 1024;

export type FileFormat = 'json' | 'csv';

export interface FileOptions extends Omit<ReadContext, 'written'> {
  /** The format, when somebody said it; else it is found by the name's ending, else by the first character. */
  format?: FileFormat;
  /** Most data rows of a CSV file. */
  maxRows?: number;
  /** Largest file, in bytes. */
  maxBytes?: number;
  /** What somebody corrected of the dialect that was found. */
  dialect?: CorrectedDialect;
}

export interface FilingFile {
  format: FileFormat;
  /** The filing when the file is without a fault, else null. */
  filing: NormalisedFiling | null;
  /** The lines without a fault; all of them when `filing` is there. */
  sound: NormalisedFiling;
  faults: Fault[];
  notices: Notice[];
  /** How the CSV file is written; null for JSON. */
  dialect: Dialect | null;
  /** Data rows of the CSV file; 0 for JSON. */
  rowCount: number;
}

/** Rows of a CSV file on the product's simple path. */
export const DEFAULT_MAX_ROWS = 500;

/**
 * The format of a file by its name's ending, else by its first character that is no blank.
 * @param name file name, or `-`
 */
export function formatOf(name: string, bytes: Uint8Array): FileFormat {
  if (/\.json$/i.test(name)) return 'json';
  if (/\.(csv|tsv)$/i.test(name)) return 'csv';
  const start = new TextDecoder().decode(bytes.subarray(0, 4096)).trimStart();
  return start.startsWith('{') || start.startsWith('[') ? 'json' : 'csv';
}

const empty: NormalisedFiling = { lines: [] };

function unusable(format: FileFormat, value: unknown, expected: string, message: string): FilingFile {
  const words = { value, expected, message };
  const fault: Fault = format === 'json' ? { pointer: '', ...words } : { row: 1, column: '', ...words };
  return { format, filing: null, sound: empty, faults: [fault], notices: [], dialect: null, rowCount: 0 };
}

function encodingNotice(encoding: Encoding): Notice[] {
  if (encoding === 'utf-8') return [];
  const message = 'The file is not UTF-8; it was read as Windows-1252. Look at accented letters and signs.';
  return [{ code: 'encoding-windows-1252', message }];
}

function readJson(text: string, notices: Notice[], options: FileOptions): FilingFile {
  const base = { format: 'json', dialect: null, rowCount: 0 } as const;
  const json = readJsonText(text);
  if (json.value === undefined) return { ...base, filing: null, sound: empty, faults: json.faults, notices };
  const read = readFiling(json.value, { ...options, written: json.written });
  const faults = inOrder([...json.faults, ...(read.ok ? [] : read.faults)]);
  if (read.ok && faults.length === 0)
    return {
      ...base,
      filing: read.filing,
      sound: read.filing,
      faults,
      notices: [...notices, ...read.notices],
    };
  const lines = (read.ok ? read.filing : read.sound).lines;
  const sound = lines.filter((l) => !faults.some((f) => f.pointer.startsWith(`${l.pointer}/`)));
  return { ...base, filing: null, sound: { lines: sound }, faults, notices };
}

/** Places of the columns in the list; a fault of a whole row, or of a column that is not known, comes first. */
const placeOfColumn = new Map(CSV_NAMES.map((name, i) => [name, i]));

/** Row by row, within a row in the order of the list of columns; cut where more would help nobody. */
function inFileOrder(faults: readonly CellFault[]): CellFault[] {
  const place = (f: CellFault) => placeOfColumn.get(f.column) ?? -1;
  const sorted = [...faults].sort((a, b) => a.row - b.row || place(a) - place(b));
  if (sorted.length <= MAX_FAULTS) return sorted;
  const message = `There are more faults than the ${MAX_FAULTS} listed here.`;
  return [
    ...sorted.slice(0, MAX_FAULTS),
    { row: 1, column: '', value: sorted.length, expected: 'fewer faults', message },
  ];
}

function dialectNotice(d: Dialect): Notice {
  const message = `Fields are parted by ${d.delimiter === 'tab' ? 'tabs' : `${d.delimiter}s`}, the decimal sign is a ${d.decimal}.`;
  return { code: 'dialect', message };
}

function readRows(text: string, encoding: Encoding, options: FileOptions): FilingFile {
  const file = readCsv(text, encoding, {
    maxRows: options.maxRows ?? DEFAULT_MAX_ROWS,
    told: options.dialect ?? {},
  });
  const notices = [...encodingNotice(encoding), dialectNotice(file.dialect)];
  const base = { format: 'csv', notices, dialect: file.dialect, rowCount: file.rowCount } as const;
  if (file.table.rows.length === 0)
    return { ...base, filing: null, sound: empty, faults: inFileOrder(file.faults) };
  const { filing, cells } = filingFromRows(file.table);
  const read = readFiling(filing, { ...options, written: cells.written });
  const missing = new Set(file.faults.filter((f) => f.row === 1).map((f) => f.column));
  const ofCells = read.ok ? [] : cells.toCells(read.faults);
  // A column that is not there is told once, not on every row.
  const more = [...cells.faults, ...ofCells].filter((f) => !(missing.has(f.column) && f.value === null));
  const faults = inFileOrder([...file.faults, ...more]);
  if (faults.length === 0 && read.ok)
    return {
      ...base,
      filing: read.filing,
      sound: read.filing,
      faults,
      notices: [...notices, ...read.notices],
    };
  const headerFaulty = file.faults.some((f) => f.row === 1);
  const lines = headerFaulty ? [] : withoutFault(read.ok ? read.filing : read.sound, cells, more);
  return { ...base, filing: null, sound: { lines }, faults };
}

/** The lines of which no row has a fault. */
function withoutFault(
  filing: NormalisedFiling,
  cells: CellReader,
  faults: readonly CellFault[],
): NormalisedLine[] {
  const rows = new Set(faults.map((f) => f.row));
  const faulty = new Set<string>();
  for (const [pointer, cell] of cells.cells) {
    const line = /^\/lines\/\d+/.exec(pointer)?.[0];
    if (line !== undefined && rows.has(cell.row)) faulty.add(line);
  }
  return filing.lines.filter((line) => !faulty.has(line.pointer));
}

/**
 * Reads a file of lines.
 * @param bytes the file's bytes
 * @param name its name, for the format when none is said; `-` for standard input
 * @returns the filing, or every fault; faults of JSON carry a pointer, those of CSV row and column
 */
export function readFilingFile(bytes: Uint8Array, name: string, options: FileOptions): FilingFile {
  const format = options.format ?? formatOf(name, bytes);
  const maxBytes = options.maxBytes ?? MAX_FILE_BYTES;
  if (bytes.length > maxBytes) {
    const most = `at most ${Math.floor(maxBytes / 1024 / 1024)} MB`;
    return unusable(
      format,
      shown(`${bytes.length} bytes`),
      most,
      `The file is larger than is taken: ${most}.`,
    );
  }
  const decoded = decodeText(bytes, options.dialect?.encoding);
  if (!decoded.ok) return unusable(format, shown(name), 'a JSON or CSV file', decoded.message);
  if (format === 'csv') return readRows(decoded.text, decoded.encoding, options);
  return readJson(decoded.text, encodingNotice(decoded.encoding), options);
}
