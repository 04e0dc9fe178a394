/** A row of the table as a section of the filing. */
import type { CellReader, CsvRow } from './csv-cells';
import { CSV_CIRCUITS, CSV_CONDUCTOR_FIELDS, CSV_GROUND_WIRES, CSV_POSITION_FIELDS } from './csv-columns';
import { cableValues } from './csv-values';

/** Part of a filing that is still being put together. */
type Draft = Record<string, unknown>;

const PHASES = ['a', 'b', 'c'] as const;

/** Plain fields of a section: column → field. */
const SECTION_FIELDS = [
  ['kind', 'kind'],
  ['length_km', 'lengthKm'],
  ['earth_resistivity_ohm_m', 'earthResistivityOhmM'],
  ['ground_wire_bonding', 'groundWireBonding'],
] as const;

/** The model that the data are for, where the file does not say it; a number that cannot be read counts as given. */
function impliedModel(cells: CellReader, row: CsvRow, prefix: string): string | undefined {
  if (cells.any(row, [`${prefix}_ac_resistance_ohm_per_km`])) return 'handbook';
  return cells.any(row, [`${prefix}_dc_resistance_20_ohm_per_km`]) ? 'tube' : undefined;
}

/** A conductor by its data, or by its library name; null where the row names none. */
function conductor(cells: CellReader, row: CsvRow, prefix: string, base: string): Draft | null {
  const columns = CSV_CONDUCTOR_FIELDS.map(([end]) => `${prefix}_${end}`);
  if (!cells.any(row, [prefix, ...columns])) return null;
  cells.at(base, row, prefix);
  const dataColumns = columns.filter((c) => c !== `${prefix}_temperature_c`);
  if (!cells.any(row, dataColumns) && cells.text(row, prefix) !== undefined) {
    const ref: Draft = {};
    cells.put(ref, 'library', base, row, prefix);
    const own = `${prefix}_temperature_c`;
    // A ground wire without a temperature of its own hangs in the same weather as the phases.
    const column = cells.any(row, [own]) || prefix === 'conductor' ? own : 'conductor_temperature_c';
    cells.put(ref, 'temperatureC', base, row, column);
    if (ref['temperatureC'] === undefined) cells.at(`${base}/temperatureC`, row, own);
    return ref;
  }
  const data: Draft = {};
  cells.put(data, 'name', base, row, prefix);
  for (const [end, field] of CSV_CONDUCTOR_FIELDS) cells.put(data, field, base, row, `${prefix}_${end}`);
  data['model'] ??= impliedModel(cells, row, prefix);
  if (data['model'] === undefined) delete data['model'];
  return data;
}

/** A place on the structure; null where the row gives neither offset nor height. */
function position(
  cells: CellReader,
  row: CsvRow,
  place: string,
  sagColumn: string,
  base: string,
  head: Draft,
): Draft | null {
  if (
    !cells.any(
      row,
      CSV_POSITION_FIELDS.map(([end]) => `${place}_${end}`),
    )
  )
    return null;
  const out: Draft = { ...head };
  for (const [end, field] of CSV_POSITION_FIELDS) {
    const own = `${place}_${end}`;
    cells.put(out, field, base, row, end === 'sag_m' && !cells.any(row, [own]) ? sagColumn : own);
  }
  cells.at(base, row, `${place}_x_m`);
  return out;
}

/** The phases of both circuits. A circuit with some of its phases is told which it lacks, at their own columns. */
function phasePositions(cells: CellReader, row: CsvRow, at: string, out: Draft[]): void {
  for (const { circuit, prefix } of CSV_CIRCUITS) {
    const lacking: string[] = [];
    const before = out.length;
    for (const phase of PHASES) {
      const base = `${at}/positions/${out.length}`;
      const head = { circuit, phase, conductor: 'phase' };
      const placed = position(cells, row, `${prefix}${phase}`, 'sag_m', base, head);
      if (!placed) {
        lacking.push(phase);
        continue;
      }
      cells.at(`${base}/conductor`, row, 'conductor');
      cells.put(placed, 'bundleCount', base, row, 'bundle_count');
      cells.put(placed, 'bundleSpacingM', base, row, 'bundle_spacing_m');
      out.push(placed);
    }
    if (out.length === before) continue;
    for (const phase of lacking) {
      const column = `${prefix}${phase}_x_m`;
      const message = `Circuit ${circuit} lacks phase ${phase}: give its offset and height.`;
      cells.fault(row, column, 'offset and height of the phase', message, `${at}/positions`);
    }
  }
}

/** The ground wires, as many as have a place; `isNamed` when the row says which conductor they are. */
function groundPositions(cells: CellReader, row: CsvRow, at: string, out: Draft[], isNamed: boolean): void {
  for (const n of CSV_GROUND_WIRES) {
    const base = `${at}/positions/${out.length}`;
    const head = { groundWire: true, conductor: 'ground' };
    const placed = position(cells, row, `gw${n}`, 'gw_sag_m', base, head);
    if (!placed) continue;
    cells.at(`${base}/conductor`, row, 'ground_conductor');
    if (!isNamed) {
      const message = 'Ground wires hang here, and their conductor is not named.';
      cells.fault(row, 'ground_conductor', 'the ground wires’ conductor', message, `${base}/conductor`);
    }
    out.push(placed);
  }
}

/**
 * A row as a section.
 * @param cells reader of the table
 * @param row the row
 * @param first the line's first row, whose units hold where a row has none
 * @param at JSON Pointer of the section
 * @returns the section as in a filing, perhaps faulty
 */
export function sectionFromRow(cells: CellReader, row: CsvRow, first: CsvRow, at: string): Draft {
  const section: Draft = {};
  cells.at(at, row, 'section');
  for (const [column, field] of SECTION_FIELDS) cells.put(section, field, at, row, column);
  const conductors: Draft = {};
  for (const [key, prefix] of [
    ['phase', 'conductor'],
    ['ground', 'ground_conductor'],
  ] as const) {
    const found = conductor(cells, row, prefix, `${at}/conductors/${key}`);
    if (found) conductors[key] = found;
  }
  const positions: Draft[] = [];
  phasePositions(cells, row, at, positions);
  groundPositions(cells, row, at, positions, conductors['ground'] !== undefined);
  cells.at(`${at}/conductors`, row, 'conductor');
  cells.at(`${at}/positions`, row, 'a_x_m');
  if (Object.keys(conductors).length > 0) section['conductors'] = conductors;
  if (positions.length > 0) section['positions'] = positions;
  if (section['kind'] === 'cable') {
    cells.at(`${at}/perLength`, row, 'cable_r1');
    section['perLength'] = cableValues(cells, row, first, `${at}/perLength`);
  }
  return section;
}
