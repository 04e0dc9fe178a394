/** Declared values, couplings and cable values out of the cells of a row. */
import { isOnBase } from '../units/declared-units';
import type { CellReader, CsvRow } from './csv-cells';
import { CSV_CIRCUITS, CSV_RATINGS } from './csv-columns';
import { DECLARED_KINDS } from './defaults';

/** Part of a filing that is still being put together. */
type Draft = Record<string, unknown>;

const SIX = ['r1', 'x1', 'b1', 'r0', 'x0', 'b0'] as const;
const COUPLING = ['r0m', 'x0m', 'b0m'] as const;

/** Where a value of a group stands, and where its unit and base may stand: the first cell that holds something. */
interface Group {
  cells: CellReader;
  /** Row of the values. */
  row: CsvRow;
  /** Rows in which unit and base are looked for, in this order. */
  rows: readonly CsvRow[];
  column: (key: string) => string;
  /** Unit columns beside the value's own, by whether it is a susceptance. */
  unitColumns: (susceptance: boolean) => readonly string[];
}

/** The first of the columns that holds something, row by row; else the last place looked at. */
function firstHeld(g: Group, columns: readonly string[]): { row: CsvRow; column: string } {
  for (const row of g.rows)
    for (const column of columns) if (g.cells.text(row, column) !== undefined) return { row, column };
  return { row: g.rows[0] ?? g.row, column: columns.at(-1) ?? '' };
}

/** One value with its unit and, for pu and %, its base; nothing where its cell is empty. */
function quantity(g: Group, key: string, target: Draft, base: string): void {
  const { cells, row } = g;
  const pointer = `${base}/${key}`;
  const column = g.column(key);
  cells.at(pointer, row, column);
  if (cells.text(row, column) === undefined) return;
  const out: Draft = {};
  cells.put(out, 'value', pointer, row, column);
  // `value` reads into the pointer of the number; digits as written are looked up there.
  const unitAt = firstHeld(g, [`${column}_unit`, ...g.unitColumns(key.startsWith('b'))]);
  cells.put(out, 'unit', pointer, unitAt.row, unitAt.column);
  const kind = DECLARED_KINDS[key] ?? 'resistance';
  if (isOnBase(kind, String(out['unit']))) {
    for (const [field, name] of [
      ['baseMva', 'base_mva'],
      ['baseKv', 'base_kv'],
    ] as const) {
      const at = firstHeld(g, [name]);
      cells.put(out, field, pointer, at.row, at.column);
    }
  }
  target[key] = out;
}

/** Columns of the unit that a row's values have in common. */
const units = (susceptance: boolean) => (susceptance ? ['susceptance_unit'] : ['impedance_unit']);

/** The seasonal ratings, as many as have something in their columns. */
function ratings(cells: CellReader, row: CsvRow, prefix: string, base: string): Draft[] {
  const out: Draft[] = [];
  for (const n of CSV_RATINGS) {
    const name = (end: string) => `${prefix}rating${n}_${end}`;
    if (!cells.any(row, [name('season'), name('continuous_a'), name('emergency_a')])) continue;
    const at = `${base}/ratings/${out.length}`;
    const rating: Draft = {};
    cells.put(rating, 'season', at, row, name('season'));
    cells.put(rating, 'continuousA', at, row, name('continuous_a'));
    cells.put(rating, 'emergencyA', at, row, name('emergency_a'));
    out.push(rating);
  }
  return out;
}

/** How the values were come by; nothing where its columns are empty. */
function basis(cells: CellReader, row: CsvRow, prefix: string, base: string): Draft | undefined {
  const ends = ['kind', 'status', 'engineer', 'date'] as const;
  if (
    !cells.any(
      row,
      ends.map((e) => `${prefix}basis_${e}`),
    )
  )
    return undefined;
  const out: Draft = {};
  for (const end of ends) cells.put(out, end, `${base}/basis`, row, `${prefix}basis_${end}`);
  return out;
}

/** Columns of a circuit's declared values that say that the circuit is declared at all. */
function circuitColumns(prefix: string): string[] {
  return [...SIX, 'circuit_id', 'rating_a', 'max_temperature_c', 'basis_kind', 'rating1_season'].map(
    (c) => `${prefix}${c}`,
  );
}

/**
 * The declared entries of a line, from its first row. Circuit 1 has one unless only circuit 2 is declared.
 * @param at JSON Pointer of the line
 */
export function declaredEntries(cells: CellReader, row: CsvRow, at: string): Draft[] {
  const out: Draft[] = [];
  const second = cells.any(row, circuitColumns('c2_'));
  for (const { circuit, prefix } of CSV_CIRCUITS) {
    const held = cells.any(row, circuitColumns(prefix));
    if (!held && (circuit === 2 || second)) continue;
    const base = `${at}/declared/${out.length}`;
    const entry: Draft = { circuit };
    cells.at(base, row, `${prefix}r1`);
    cells.at(`${base}/circuit`, row, `${prefix}r1`);
    const group: Group = { cells, row, rows: [row], column: (k) => `${prefix}${k}`, unitColumns: units };
    for (const key of SIX) quantity(group, key, entry, base);
    cells.put(entry, 'circuitId', base, row, `${prefix}circuit_id`);
    cells.put(entry, 'ratingA', base, row, `${prefix}rating_a`);
    cells.put(entry, 'maxTemperatureC', base, row, `${prefix}max_temperature_c`);
    const seasons = ratings(cells, row, prefix, base);
    if (seasons.length > 0) entry['ratings'] = seasons;
    const told = basis(cells, row, prefix, base);
    if (told) entry['basis'] = told;
    out.push(entry);
  }
  return out;
}

/** The declared coupling of a line, from its first row; nothing where its cells are empty. */
export function declaredCoupling(cells: CellReader, row: CsvRow, at: string): Draft[] | undefined {
  if (!cells.any(row, COUPLING)) return undefined;
  const base = `${at}/declaredMutual/0`;
  cells.at(base, row, 'r0m');
  const entry: Draft = { circuits: [1, 2] };
  const group: Group = { cells, row, rows: [row], column: (k) => k, unitColumns: units };
  for (const key of COUPLING) quantity(group, key, entry, base);
  return [entry];
}

/**
 * The values of a cable section: one set, or one a circuit when circuit 2 has its own. On the second and later rows
 * of a line the plain columns r1 … b0 may hold them too, since declared values stand on the first row.
 * @param at JSON Pointer of `perLength`
 */
export function cableValues(cells: CellReader, row: CsvRow, first: CsvRow, at: string): Draft | Draft[] {
  const columnsOf = (prefix: string) => SIX.map((k) => `${prefix}cable_${k}`);
  const plain = row !== first && !cells.any(row, [...columnsOf(''), ...columnsOf('c2_')]);
  const name = (prefix: string) => (k: string) => (plain ? `${prefix}${k}` : `${prefix}cable_${k}`);
  const read = (prefix: string, base: string, head: Draft): Draft => {
    const out: Draft = { ...head };
    const unitColumns = (s: boolean) =>
      s ? ['cable_susceptance_unit', 'susceptance_unit'] : ['cable_impedance_unit', 'impedance_unit'];
    const group: Group = {
      cells,
      row,
      rows: row === first ? [row] : [row, first],
      column: name(prefix),
      unitColumns,
    };
    for (const key of SIX) quantity(group, key, out, base);
    return out;
  };
  if (!cells.any(row, SIX.map(name('c2_')))) return read('', at, {});
  return CSV_CIRCUITS.map(({ circuit, prefix }, i) => {
    cells.at(`${at}/${i}`, row, name(prefix)('r1'));
    return read(prefix, `${at}/${i}`, { circuit });
  });
}
