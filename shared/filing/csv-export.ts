/** From lines that were read to the rows of a CSV file: the way back of csv-rows. */
import type { Conductor, FilingLine, Position, Section } from '../contracts/filing.generated';
import {
  CSV_CIRCUITS,
  CSV_COLUMNS,
  CSV_CONDUCTOR_FIELDS,
  CSV_GROUND_WIRES,
  CSV_POSITION_FIELDS,
  CSV_RATINGS,
} from './csv-columns';
import { canonicalJson } from './canonical';
import type { LineSheet } from './types';

/** One row: texts by column, without the empty ones. */
export type CsvRowTexts = Record<string, string>;

/** Rows of a file with the columns that they use; or what of the lines such a file cannot hold. */
export type CsvExport =
  | { ok: true; columns: string[]; rows: CsvRowTexts[] }
  | { ok: false; reasons: { line: string; message: string }[] };

interface Quantity {
  value: number;
  unit: string;
  baseMva?: number;
  baseKv?: number;
}

const SIX = ['r1', 'x1', 'b1', 'r0', 'x0', 'b0'] as const;
const COUPLING = ['r0m', 'x0m', 'b0m'] as const;
/** Susceptances have a unit column of their own. */
const isSusceptance = (key: string) => key.startsWith('b');

/** Writes one line; what does not fit goes to `reasons`. */
class LineWriter {
  readonly reasons: string[] = [];
  private readonly line: FilingLine;

  constructor(private readonly sheet: LineSheet) {
    this.line = sheet.line;
  }

  /** Digits as written, where they are kept. */
  private put(row: CsvRowTexts, column: string, value: unknown, pointer = ''): void {
    if (value === undefined) return;
    row[column] = (typeof value === 'number' && this.sheet.written[pointer]) || String(value);
  }

  /** A conductor's name and data in the columns of its prefix. */
  private conductor(row: CsvRowTexts, prefix: string, c: Conductor, pointer: string): void {
    this.put(row, prefix, c.name);
    for (const [end, field] of CSV_CONDUCTOR_FIELDS)
      this.put(row, `${prefix}_${end}`, c[field], `${pointer}/${field}`);
  }

  /** The one value that all of them have; the file holds it once. */
  private same<T>(values: readonly T[], what: string, section: number): T | undefined {
    const differs = new Set(values.map((v) => canonicalJson(v ?? null))).size > 1;
    if (differs) this.reasons.push(`section ${section + 1} has more than one ${what}`);
    return values[0];
  }

  /** Offset, height and sag of one place. */
  private position(row: CsvRowTexts, place: string, p: Position, pointer: string): void {
    for (const [end, field] of CSV_POSITION_FIELDS)
      this.put(row, `${place}_${end}`, p[field], `${pointer}/${field}`);
  }

  /** Conductors, bundle and places of an overhead section. */
  private geometry(row: CsvRowTexts, s: Section, index: number): void {
    const { conductors, positions } = s;
    if (!conductors || !positions) return;
    const at = `/sections/${index}`;
    const placed = positions.map((p, i) => ({ p, pointer: `${at}/positions/${i}` }));
    const phases = placed.filter(({ p }) => !p.groundWire);
    const wires = placed.filter(({ p }) => p.groundWire);
    for (const [list, prefix, what] of [
      [phases, 'conductor', 'phase conductor'],
      [wires, 'ground_conductor', 'kind of ground wire'],
    ] as const) {
      const found = this.same(
        list.map(({ p }) => conductors[p.conductor]),
        what,
        index,
      );
      const key = list[0]?.p.conductor.replaceAll('~', '~0').replaceAll('/', '~1');
      if (found) this.conductor(row, prefix, found, `${at}/conductors/${key ?? ''}`);
    }
    const first = phases[0];
    this.put(
      row,
      'bundle_count',
      this.same(
        phases.map(({ p }) => p.bundleCount),
        'bundle count',
        index,
      ),
    );
    const spacing = this.same(
      phases.map(({ p }) => p.bundleSpacingM),
      'bundle spacing',
      index,
    );
    this.put(row, 'bundle_spacing_m', spacing, `${first?.pointer ?? ''}/bundleSpacingM`);
    for (const { p, pointer } of phases) {
      const prefix = CSV_CIRCUITS.find((c) => c.circuit === p.circuit)?.prefix ?? '';
      this.position(row, `${prefix}${p.phase ?? ''}`, p, pointer);
    }
    if (wires.length > CSV_GROUND_WIRES.length)
      this.reasons.push(`section ${index + 1} has more than ${CSV_GROUND_WIRES.length} ground wires`);
    wires.forEach(({ p, pointer }, i) => this.position(row, `gw${i + 1}`, p, pointer));
  }

  /** A value with its unit where that is not the row's, and its base, which the row holds once. */
  private quantity(row: CsvRowTexts, column: string, unitColumn: string, q: Quantity, pointer: string): void {
    this.put(row, column, q.value, `${pointer}/value`);
    row[unitColumn] ??= q.unit;
    if (row[unitColumn] !== q.unit) row[`${column}_unit`] = q.unit;
    for (const [name, value] of [
      ['base_mva', q.baseMva],
      ['base_kv', q.baseKv],
    ] as const) {
      if (value === undefined || !['pu', '%'].includes(q.unit)) continue;
      const before = row[name];
      if (before !== undefined && before !== String(value))
        this.reasons.push('its values stand on more than one base');
      row[name] = String(value);
    }
  }

  /** A cable's values, in one set or one a circuit. */
  private cable(row: CsvRowTexts, s: Section, index: number): void {
    const at = `/sections/${index}/perLength`;
    const write = (values: object, prefix: string, base: string) => {
      for (const key of SIX) {
        const q = (values as Record<string, Quantity | undefined>)[key];
        const unit = isSusceptance(key) ? 'cable_susceptance_unit' : 'cable_impedance_unit';
        if (q) this.quantity(row, `${prefix}cable_${key}`, unit, q, `${base}/${key}`);
      }
    };
    if (Array.isArray(s.perLength))
      s.perLength.forEach((v, i) => write(v, v.circuit === 2 ? 'c2_' : '', `${at}/${i}`));
    else if (s.perLength) write(s.perLength, '', at);
    if (Array.isArray(s.perLength) && s.perLength.length === 1)
      this.reasons.push(`section ${index + 1} lists its cable’s values for a single circuit`);
  }

  /** What is declared of the circuits and their coupling: on the line's first row. */
  private declared(row: CsvRowTexts): void {
    const line = this.line;
    line.declared.forEach((d, i) => {
      const prefix = CSV_CIRCUITS.find((c) => c.circuit === d.circuit)?.prefix ?? '';
      const at = `/declared/${i}`;
      for (const key of SIX) {
        const q = d[key];
        if (q) this.quantity(row, `${prefix}${key}`, unitColumn(key), q, `${at}/${key}`);
      }
      this.put(row, `${prefix}circuit_id`, d.circuitId);
      this.put(row, `${prefix}rating_a`, d.ratingA, `${at}/ratingA`);
      this.put(row, `${prefix}max_temperature_c`, d.maxTemperatureC, `${at}/maxTemperatureC`);
      if ((d.ratings?.length ?? 0) > CSV_RATINGS.length)
        this.reasons.push(`circuit ${d.circuit} has more than ${CSV_RATINGS.length} seasonal ratings`);
      d.ratings?.forEach((r, n) => {
        const name = (end: string) => `${prefix}rating${n + 1}_${end}`;
        this.put(row, name('season'), r.season);
        this.put(row, name('continuous_a'), r.continuousA, `${at}/ratings/${n}/continuousA`);
        this.put(row, name('emergency_a'), r.emergencyA, `${at}/ratings/${n}/emergencyA`);
      });
      for (const end of ['kind', 'status', 'engineer', 'date'] as const)
        this.put(row, `${prefix}basis_${end}`, d.basis?.[end]);
    });
    line.declaredMutual?.forEach((m, i) => {
      for (const key of COUPLING) {
        const q = m[key];
        if (q) this.quantity(row, key, unitColumn(key), q, `/declaredMutual/${i}/${key}`);
      }
    });
  }

  /** The line's rows, one a section. */
  rows(): CsvRowTexts[] {
    const { name, from, to, nominalVoltageKv, frequencyHz, transposed, sections } = this.line;
    return sections.map((s, i) => {
      const row: CsvRowTexts = { name, section: String(i + 1) };
      if (i === 0) {
        Object.assign(row, { from, to, transposed: String(transposed ?? true) });
        this.put(row, 'nominal_voltage_kv', nominalVoltageKv, '/nominalVoltageKv');
        this.put(row, 'frequency_hz', frequencyHz, '/frequencyHz');
        this.declared(row);
      }
      this.put(row, 'kind', s.kind);
      this.put(row, 'length_km', s.lengthKm, `/sections/${i}/lengthKm`);
      this.put(row, 'earth_resistivity_ohm_m', s.earthResistivityOhmM, `/sections/${i}/earthResistivityOhmM`);
      this.put(row, 'ground_wire_bonding', s.groundWireBonding);
      this.geometry(row, s, i);
      if (s.kind === 'cable') this.cable(row, s, i);
      return row;
    });
  }
}

const unitColumn = (key: string) => (isSusceptance(key) ? 'susceptance_unit' : 'impedance_unit');

/**
 * Lines as rows of a CSV file, with the digits as they were written.
 * @param sheets the lines, complete in themselves
 * @returns the rows and the columns that they use, in the order of the list; or, by line, what does not fit into rows
 */
export function rowsOfLines(sheets: readonly LineSheet[]): CsvExport {
  const rows: CsvRowTexts[] = [];
  const reasons: { line: string; message: string }[] = [];
  for (const sheet of sheets) {
    const writer = new LineWriter(sheet);
    rows.push(...writer.rows());
    for (const reason of new Set(writer.reasons))
      reasons.push({
        line: sheet.line.name,
        message: `A CSV row cannot hold this line: ${reason}. Take JSON.`,
      });
  }
  if (reasons.length > 0) return { ok: false, reasons };
  const used = new Set(rows.flatMap((row) => Object.keys(row)));
  return { ok: true, columns: CSV_COLUMNS.map((c) => c.name).filter((c) => used.has(c)), rows };
}
