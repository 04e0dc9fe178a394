/**
 * The columns of the lines' CSV file: one row a section, the rows of a line together, declared values on the first.
 * This table is the list that is published (schemas/files/lines-csv.schema.json is made from it), the one by which
 * headers are read, and the one by which files are written.
 */

/** What a cell holds. */
export type CellKind = 'text' | 'number' | 'choice' | 'boolean';

/** One column. */
export interface CsvColumn {
  name: string;
  kind: CellKind;
  /** What it means, with its unit. */
  meaning: string;
  /** Whether it stands once for a line (on its first row) or on each row. */
  scope: 'line' | 'section';
  /** Other spelling that is taken. */
  alias?: string;
}

/** A column as it is listed below; its scope follows from the list. */
type Row = readonly [name: string, kind: CellKind, meaning: string];

const columns = (scope: CsvColumn['scope'], rows: readonly Row[]): CsvColumn[] =>
  rows.map(([name, kind, meaning]) => ({ name, kind, meaning, scope }));

/** The six declared values of a circuit, and the three of a coupling. */
const SIX = ['r1', 'x1', 'b1', 'r0', 'x0', 'b0'] as const;
const COUPLING = ['r0m', 'x0m', 'b0m'] as const;

/** Seasons that a row has columns for. */
export const CSV_RATINGS = [1, 2, 3, 4] as const;
/** Ground wires that a row has columns for. */
export const CSV_GROUND_WIRES = [1, 2, 3, 4] as const;
/** Column prefixes of the two circuits. */
export const CSV_CIRCUITS = [
  { circuit: 1, prefix: '' },
  { circuit: 2, prefix: 'c2_' },
] as const;

/** Fields of a conductor: end of the column's name → field of the filing format. */
export const CSV_CONDUCTOR_FIELDS = [
  ['model', 'model', 'choice', 'model: handbook or tube; found from the data when empty'],
  ['diameter_mm', 'diameterMm', 'number', 'outer diameter, mm'],
  ['core_diameter_mm', 'coreDiameterMm', 'number', 'diameter of the core that carries no current, mm'],
  ['gmr_mm', 'gmrMm', 'number', 'geometric mean radius, mm'],
  [
    'ac_resistance_ohm_per_km',
    'acResistanceOhmPerKm',
    'number',
    'a.c. resistance at its temperature, ohm/km',
  ],
  ['dc_resistance_20_ohm_per_km', 'dcResistance20OhmPerKm', 'number', 'd.c. resistance at 20 °C, ohm/km'],
  ['temperature_c', 'temperatureC', 'number', 'temperature, °C'],
  [
    'temperature_coefficient_per_k',
    'temperatureCoefficientPerK',
    'number',
    'temperature coefficient at 20 °C, 1/K',
  ],
] as const;

/** Fields of a position: end of the column's name → field of the filing format. */
export const CSV_POSITION_FIELDS = [
  ['x_m', 'horizontalM', 'offset from the centre line, m'],
  ['height_m', 'attachmentHeightM', 'height of the attachment above ground, m'],
  ['sag_m', 'sagM', 'sag at mid-span, m'],
] as const;

/** Columns of a conductor: its name and each of its data. */
function conductorColumns(prefix: string, who: string): CsvColumn[] {
  const fields = CSV_CONDUCTOR_FIELDS.map(([end, , kind, meaning]): Row => [
    `${prefix}_${end}`,
    kind,
    `${who}: ${meaning}`,
  ]);
  const name: Row = [prefix, 'text', `${who}: name in the library, or its name when its data are given`];
  return columns('section', [name, ...fields]).map((c) =>
    c.name.endsWith('dc_resistance_20_ohm_per_km')
      ? { ...c, alias: c.name.replace('resistance_20_', 'resistance20_') }
      : c,
  );
}

/** Columns of a place on the structure. */
function positionColumns(place: string, who: string): CsvColumn[] {
  return columns(
    'section',
    CSV_POSITION_FIELDS.map(([end, , meaning]): Row => [`${place}_${end}`, 'number', `${who}: ${meaning}`]),
  );
}

const phaseColumns = CSV_CIRCUITS.flatMap(({ circuit, prefix }) =>
  ['a', 'b', 'c'].flatMap((p) => positionColumns(`${prefix}${p}`, `circuit ${circuit}, phase ${p}`)),
);

/** Columns of what is declared of a circuit. */
function declaredColumns(prefix: string, circuit: number): CsvColumn[] {
  const who = `circuit ${circuit}`;
  return columns('line', [
    ...SIX.map((k): Row => [`${prefix}${k}`, 'number', `${who}: declared ${k}, in its unit`]),
    ...SIX.map((k): Row => [`${prefix}${k}_unit`, 'choice', `${who}: unit of ${k} where it is another one`]),
    [`${prefix}circuit_id`, 'text', `${who}: the applicant’s own name of it`],
    [`${prefix}rating_a`, 'number', `${who}: continuous rating at its maximum temperature, A`],
    [`${prefix}max_temperature_c`, 'number', `${who}: conductor temperature that the rating is for, °C`],
    ...CSV_RATINGS.flatMap((n): Row[] => [
      [`${prefix}rating${n}_season`, 'text', `${who}: season of its rating ${n}`],
      [`${prefix}rating${n}_continuous_a`, 'number', `${who}: continuous rating in that season, A`],
      [`${prefix}rating${n}_emergency_a`, 'number', `${who}: short-time rating in that season, A`],
    ]),
    [`${prefix}basis_kind`, 'choice', `${who}: where the values come from`],
    [`${prefix}basis_status`, 'choice', `${who}: state of the line that they describe`],
    [`${prefix}basis_engineer`, 'text', `${who}: who answers for the values`],
    [`${prefix}basis_date`, 'text', `${who}: day of the calculation or measurement, YYYY-MM-DD`],
  ]);
}

/** Columns of a cable's values for a circuit. */
function cableColumns(prefix: string, circuit: number): CsvColumn[] {
  const who = `cable section, circuit ${circuit}`;
  return columns('section', [
    ...SIX.map((k): Row => [
      `${prefix}cable_${k}`,
      'number',
      `${who}: ${k} from the maker’s sheet, in its unit`,
    ]),
    ...SIX.map((k): Row => [
      `${prefix}cable_${k}_unit`,
      'choice',
      `${who}: unit of ${k} where it is another one`,
    ]),
  ]);
}

/** Every column, in the order in which a file is written. */
export const CSV_COLUMNS: readonly CsvColumn[] = [
  ...columns('line', [
    ['name', 'text', 'name of the line, the same on all its rows'],
    ['from', 'text', 'where the line begins'],
    ['to', 'text', 'where the line ends'],
    ['nominal_voltage_kv', 'number', 'nominal phase-to-phase voltage, kV'],
    ['frequency_hz', 'number', 'rated frequency, 50 or 60, Hz'],
    ['transposed', 'boolean', 'true or false; true when empty'],
  ]),
  ...columns('section', [
    ['section', 'number', 'number of the section within the line, 1 to k; may be empty when there is one'],
    ['kind', 'choice', 'overhead or cable; overhead when empty'],
    ['length_km', 'number', 'length of the section, km'],
    ['earth_resistivity_ohm_m', 'number', 'resistivity of the earth, ohm metre; the owner’s when empty'],
    ['ground_wire_bonding', 'choice', 'continuous or segmented; continuous when empty'],
  ]),
  ...conductorColumns('conductor', 'phase conductor'),
  ...conductorColumns('ground_conductor', 'ground wire'),
  ...columns('section', [
    ['bundle_count', 'number', 'subconductors of each phase, 1 to 8; 1 when empty'],
    ['bundle_spacing_m', 'number', 'side of the bundle’s polygon, m'],
    ['sag_m', 'number', 'sag of the phases at mid-span where a phase has none of its own, m'],
    ['gw_sag_m', 'number', 'sag of the ground wires at mid-span where a wire has none of its own, m'],
  ]),
  ...phaseColumns,
  ...CSV_GROUND_WIRES.flatMap((n) => positionColumns(`gw${n}`, `ground wire ${n}`)),
  ...CSV_CIRCUITS.flatMap(({ circuit, prefix }) => declaredColumns(prefix, circuit)),
  ...columns('line', [
    ...COUPLING.map((k): Row => [k, 'number', `declared coupling of the two circuits, ${k}, in its unit`]),
    ...COUPLING.map((k): Row => [`${k}_unit`, 'choice', `unit of ${k} where it is another one`]),
  ]),
  ...columns('section', [
    ['impedance_unit', 'choice', 'unit of the resistances and reactances'],
    ['susceptance_unit', 'choice', 'unit of the susceptances'],
    ['base_mva', 'number', 'power base of pu and % values, MVA; the owner’s when empty'],
    ['base_kv', 'number', 'voltage base of pu and % values, kV; the nominal voltage when empty'],
    [
      'cable_impedance_unit',
      'choice',
      'unit of a cable’s resistances and reactances where it is another one',
    ],
    ['cable_susceptance_unit', 'choice', 'unit of a cable’s susceptances where it is another one'],
  ]),
  ...CSV_CIRCUITS.flatMap(({ circuit, prefix }) => cableColumns(prefix, circuit)),
];

/** Columns without which no row can be read. */
export const CSV_REQUIRED = [
  'name',
  'from',
  'to',
  'nominal_voltage_kv',
  'frequency_hz',
  'length_km',
] as const;

const byName = new Map(
  CSV_COLUMNS.flatMap((c) => [[c.name, c] as const, ...(c.alias ? [[c.alias, c] as const] : [])]),
);

/** The column that a header names, or undefined. */
export function csvColumn(header: string): CsvColumn | undefined {
  return byName.get(header);
}

/** The names of all columns, for "did you mean". */
export const CSV_NAMES: readonly string[] = CSV_COLUMNS.map((c) => c.name);
