/** The cells of a table, read one by one, each remembered by the place in the filing that it goes to. */
import { inWords, shown } from '../contracts/faults';
import type { CellFault, PointerFault } from '../contracts/faults';
import { readNumber } from '../units/number-text';
import type { DecimalSign } from '../units/number-text';
import { csvColumn } from './csv-columns';

/** A table as it was parsed: cells by column name. */
export interface CsvTable {
  /** Names of the columns that the header has, as in the table of columns. */
  columns: ReadonlySet<string>;
  rows: readonly CsvRow[];
  decimal: DecimalSign;
}

/** A row that is not blank. */
export interface CsvRow {
  /** Row number as in the file; the header is 1. */
  row: number;
  cells: ReadonlyMap<string, string>;
}

/** Where a value of the filing stands in the table. */
export interface Cell {
  row: number;
  column: string;
}

/** A spreadsheet's mark that a cell is text: it is taken off again. See the writer. */
const NEUTRALISED = /^'+[=+\-@\t\r\n\0＝＋－＠]/;

const sample = { point: '1234.5', comma: '1234,5' } as const;

/** Reads cells and keeps the books: which pointer came from which cell, digits as written, faults. */
export class CellReader {
  readonly faults: CellFault[] = [];
  readonly cells = new Map<string, Cell>();
  readonly written: Record<string, string> = {};
  /** Pointers of which a fault is already told. */
  readonly told = new Set<string>();
  /** Faults told so far, so that a cell that goes to several places is spoken of once. */
  private readonly said = new Set<string>();

  constructor(readonly table: CsvTable) {}

  /** The text of a cell after trimming, or undefined when it is empty or has no column. */
  text(row: CsvRow, column: string): string | undefined {
    const text = row.cells.get(column)?.trim();
    if (text === undefined || text === '') return undefined;
    return NEUTRALISED.test(text) && csvColumn(column)?.kind === 'text' ? text.slice(1) : text;
  }

  /** Notes that the value at `pointer` stands (or would stand) in a cell. */
  at(pointer: string, row: CsvRow, column: string): void {
    this.cells.set(pointer, { row: row.row, column });
  }

  /** Tells a fault of a cell, once for all places that the cell goes to; `pointer` needs no second one. */
  fault(row: CsvRow, column: string, expected: string, message: string, pointer?: string): void {
    if (pointer !== undefined) this.told.add(pointer);
    const key = `${row.row} ${column} ${message}`;
    if (this.said.has(key)) return;
    this.said.add(key);
    const value = shown(row.cells.get(column)?.trim() || null);
    this.faults.push({ row: row.row, column, value, expected, message });
  }

  /** A number of a cell; undefined when it is empty or faulty. */
  number(row: CsvRow, column: string, pointer: string): number | undefined {
    const text = this.text(row, column);
    if (text === undefined) return undefined;
    const read = readNumber(text, this.table.decimal);
    if (read.ok) {
      if (String(read.value) !== read.digits) this.written[pointer] = read.digits;
      return read.value;
    }
    const example = sample[this.table.decimal];
    const expected = `a number such as ${example}`;
    const message =
      read.reason === 'range'
        ? `${inWords(text)} is a number that cannot be reckoned with.`
        : `${inWords(text)} is not a number. Write it as ${example}, with no thousands sign.`;
    this.fault(row, column, expected, message, pointer);
    return undefined;
  }

  /** The value of a cell by its column's kind; undefined when it is empty or faulty. */
  value(row: CsvRow, column: string, pointer: string): unknown {
    const kind = csvColumn(column)?.kind;
    if (kind === 'number') return this.number(row, column, pointer);
    const text = this.text(row, column);
    if (kind !== 'boolean' || text === undefined) return text;
    if (/^(true|false)$/i.test(text)) return text.toLowerCase() === 'true';
    this.fault(row, column, 'true or false', `${inWords(text)} is neither true nor false.`, pointer);
    return undefined;
  }

  /** Puts a cell's value into `target` and notes the cell, whether it holds something or not. */
  put(target: Record<string, unknown>, key: string, base: string, row: CsvRow, column: string): void {
    const pointer = `${base}/${key}`;
    this.at(pointer, row, column);
    const value = this.value(row, column, pointer);
    if (value !== undefined) target[key] = value;
  }

  /** Whether any of the columns holds something in the row. */
  any(row: CsvRow, columns: readonly string[]): boolean {
    return columns.some((c) => this.text(row, c) !== undefined);
  }

  /** The cell of a pointer, or of the nearest thing around it that has one. */
  private cellOf(pointer: string): Cell | undefined {
    for (let at = pointer; at !== ''; at = at.slice(0, at.lastIndexOf('/'))) {
      const cell = this.cells.get(at);
      if (cell) return cell;
    }
    return undefined;
  }

  /** Faults of the filing as faults of cells: told ones left out, one fault a cell. */
  toCells(faults: readonly PointerFault[]): CellFault[] {
    const out: CellFault[] = [];
    const seen = new Set(this.faults.map((f) => `${f.row} ${f.column}`));
    for (const { pointer, ...rest } of faults) {
      if (this.told.has(pointer)) continue;
      const cell = this.cellOf(pointer) ?? { row: 1, column: '' };
      const key = `${cell.row} ${cell.column}`;
      if (seen.has(key)) continue;
      seen.add(key);
      out.push({ ...cell, ...rest });
    }
    return out;
  }
}
