/** Lines as a file to download: JSON with the digits as they were written, or CSV that no spreadsheet runs. */
import Papa from 'papaparse';
import { csvColumn } from '../../shared/filing/csv-columns';
import { rowsOfLines } from '../../shared/filing/csv-export';
import type { CsvExport } from '../../shared/filing/csv-export';
import { jsonOfLines } from '../../shared/filing/json-export';
import type { LineSheet } from '../../shared/filing/types';

/** Beginnings of a text that a spreadsheet would run as a formula, or that our own mark could be taken for. */
const FORMULA = /^'*[=+\-@\t\r\n\0＝＋－＠]/;

/** A text that a spreadsheet shows and does not run. Numbers are not texts: a negative one stays as it is. */
export function neutralised(text: string): string {
  return FORMULA.test(text) ? `'${text}` : text;
}

/** A file, or why the lines do not fit into one of that format. */
export type WrittenFile =
  | { ok: true; bytes: Uint8Array; mediaType: string }
  | { ok: false; reasons: Extract<CsvExport, { ok: false }>['reasons'] };

/** Lines as CSV: commas, decimal points, CRLF, with a byte order mark, by which spreadsheets know UTF-8. */
export function csvFile(sheets: readonly LineSheet[]): WrittenFile {
  const table = rowsOfLines(sheets);
  if (!table.ok) return table;
  const data = table.rows.map((row) =>
    table.columns.map((column) => {
      const text = row[column] ?? '';
      return csvColumn(column)?.kind === 'number' ? text : neutralised(text);
    }),
  );
  const text = Papa.unparse({ fields: table.columns, data }, { newline: '\r\n' });
  return {
    ok: true,
    bytes: new TextEncoder().encode(`\ufeff${text}\r\n`),
    mediaType: 'text/csv; charset=utf-8',
  };
}

/** Lines as a filing in JSON. */
export function jsonFile(sheets: readonly LineSheet[]): WrittenFile {
  return { ok: true, bytes: new TextEncoder().encode(jsonOfLines(sheets)), mediaType: 'application/json' };
}
