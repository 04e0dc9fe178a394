/** A small CSV file of lines to be broken in tests, and ways to read one. */
import { readFilingFile } from '#server/files/read-filing-file';
import type { FileOptions, FilingFile } from '#server/files/read-filing-file';
import { CONTEXT } from '../../shared/filing/sample';

/** Header and one row a line: two lines of one section each. */
export const COLUMNS = [
  ...[
    'name',
    'from',
    'to',
    'nominal_voltage_kv',
    'frequency_hz',
    'section',
    'length_km',
    'earth_resistivity_ohm_m',
  ],
  ...[
    'conductor',
    'conductor_temperature_c',
    'a_x_m',
    'a_height_m',
    'b_x_m',
    'b_height_m',
    'c_x_m',
    'c_height_m',
  ],
  ...['sag_m', 'r1', 'x1', 'b1', 'impedance_unit', 'susceptance_unit'],
] as const;

export type Column = (typeof COLUMNS)[number];

const GOOD: Record<Column, string> = {
  name: 'Sarn – Ostrey',
  from: 'Sarn',
  to: 'Ostrey',
  nominal_voltage_kv: '230',
  frequency_hz: '60',
  section: '1',
  length_km: '18.20',
  earth_resistivity_ohm_m: '100',
  conductor: 'Cardinal',
  conductor_temperature_c: '50',
  a_x_m: '-7',
  a_height_m: '20',
  b_x_m: '0',
  b_height_m: '20',
  c_x_m: '7',
  c_height_m: '20',
  sag_m: '7',
  r1: '0.0673',
  x1: '0.4846',
  b1: '3.420',
  impedance_unit: 'ohm/km',
  susceptance_unit: 'uS/km',
};

const quoted = (cell: string) => (/[",;\t\n]/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell);

/** Text of a file: a row for each set of changes to a sound row. */
export function csv(...rows: Partial<Record<Column, string>>[]): string {
  const lines = rows.map((r, i) => {
    const own = { ...GOOD, name: `Line ${i + 1}`, ...r };
    return COLUMNS.map((c) => quoted(own[c])).join(',');
  });
  return [COLUMNS.join(','), ...lines, ''].join('\n');
}

/** The same file with another delimiter and decimal sign. */
export function inDialect(text: string, delimiter: string, decimal: '.' | ','): string {
  return text
    .split('\n')
    .map((row) =>
      row
        .split(',')
        .map((c) => (/^-?\d+\.\d+$/.test(c) ? c.replace('.', decimal) : c))
        .join(delimiter),
    )
    .join('\n');
}

/** Reads a text or bytes as a CSV file. */
export function readCsvFile(data: string | Uint8Array, options: Partial<FileOptions> = {}): FilingFile {
  const bytes = typeof data === 'string' ? new TextEncoder().encode(data) : data;
  return readFilingFile(bytes, 'lines.csv', { ...CONTEXT, ...options });
}

/** Faults as `row column: message`. */
export function cellFaults(data: string | Uint8Array, options: Partial<FileOptions> = {}): string[] {
  return readCsvFile(data, options).faults.map((f) =>
    'row' in f ? `${f.row} ${f.column}: ${f.message}` : `${f.pointer}: ${f.message}`,
  );
}
