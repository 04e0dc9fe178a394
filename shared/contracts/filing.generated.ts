/** Types of the filing format. Made from the schemas by `npm run generate`; do not edit. */

/** A thing of which any part may still be missing. */
export type DeepPartial<T> = T extends readonly (infer U)[]
  ? DeepPartial<U>[]
  : T extends object
    ? { [K in keyof T]?: DeepPartial<T[K]> }
    : T;

/** A conductor: its data, or the name of one in the library with the temperature at which it is meant. */
export interface Conductor {
  /** Name in the conductor library. Its data are copied into the filing. */
  library?: Name;
  /** The conductor's name, for people. */
  name?: Name;
  /** handbook: tabled a.c. resistance and GMR. tube: d.c. resistance and diameters, skin effect computed. */
  model?: 'handbook' | 'tube';
  /** Outer diameter. Unit: mm. */
  diameterMm?: number;
  /** Diameter of the core that carries no current; 0 for a solid wire. Unit: mm. */
  coreDiameterMm?: number;
  /** Geometric mean radius. Unit: mm. */
  gmrMm?: number;
  /** Resistance to alternating current at temperatureC. Unit: ohm/km. */
  acResistanceOhmPerKm?: number;
  /** Resistance to direct current at 20 degrees Celsius. Unit: ohm/km. */
  dcResistance20OhmPerKm?: number;
  /** Temperature of the conductor. Unit: degrees Celsius. */
  temperatureC?: number;
  /** Temperature coefficient of the resistance at 20 degrees Celsius. Unit: 1/K. */
  temperatureCoefficientPerK?: number;
}

/** What the applicant declares of one circuit. */
export interface DeclaredCircuit {
  /** Number of the circuit, from 1. Unit: none (ordinal). */
  circuit: number;
  /** The applicant's own name of the circuit. */
  circuitId?: Name;
  /** Positive-sequence resistance. */
  r1: DeclaredResistance;
  /** Positive-sequence reactance. */
  x1: DeclaredReactance;
  /** Positive-sequence susceptance. */
  b1: DeclaredSusceptance;
  /** Zero-sequence resistance. */
  r0?: DeclaredResistance;
  /** Zero-sequence reactance. */
  x0?: DeclaredReactance;
  /** Zero-sequence susceptance. */
  b0?: DeclaredSusceptance;
  /** Continuous rating at maxTemperatureC. Unit: A. */
  ratingA?: number;
  /** Conductor temperature that the rating is for. Unit: degrees Celsius. */
  maxTemperatureC?: number;
  /** Ratings by season. */
  ratings?: SeasonRating[];
  basis?: DeclarationBasis;
}

/** Ratings in one season. */
export interface SeasonRating {
  /** Season, such as summer. */
  season: Key;
  /** Continuous rating. Unit: A. */
  continuousA: number;
  /** Short-time rating. Unit: A. */
  emergencyA?: number;
}

/** How the values were come by, and who answers for them. */
export interface DeclarationBasis {
  /** Where the values come from. */
  kind: 'calculated' | 'measured' | 'manufacturer' | 'estimated';
  /** State of the line that they describe. */
  status?: 'preliminary' | 'design' | 'as-built' | 'in-service';
  /** Who answers for the values. */
  engineer?: Name;
  /** Day of the calculation or the measurement, YYYY-MM-DD. */
  date?: string;
}

/** One line: its sections in series, and what is declared of its circuits. */
export interface FilingLine {
  /** Name of the line, unique in the filing. */
  name: Name;
  /** Where the line begins. */
  from: Name;
  /** Where the line ends. */
  to: Name;
  /** Nominal phase-to-phase voltage. Unit: kV. */
  nominalVoltageKv: number;
  /** Rated frequency. Unit: Hz. */
  frequencyHz: 50 | 60;
  /** Whether the phases are transposed over the line. */
  transposed?: boolean;
  /** Sections in series, from the line's beginning to its end. */
  sections: Section[];
  /** One entry a circuit. */
  declared: DeclaredCircuit[];
  /** Coupling of the two circuits. */
  declaredMutual?: DeclaredMutual[];
}

/** Declared zero-sequence coupling of two circuits on one structure. */
export interface DeclaredMutual {
  /** The two circuits. Unit: none (ordinals). */
  circuits: [number, number];
  /** Zero-sequence mutual resistance. */
  r0m?: DeclaredResistance;
  /** Zero-sequence mutual reactance. */
  x0m?: DeclaredReactance;
  /** Off-diagonal zero-sequence susceptance (negative). */
  b0m?: DeclaredSusceptance;
}

/** Where a phase conductor (or its bundle) or a ground wire hangs. Offsets and heights are of the bundle's centre. */
export interface Position {
  /** true for a ground wire. */
  groundWire?: true;
  /** Number of the circuit, from 1. Unit: none (ordinal). */
  circuit?: number;
  /** Phase of the circuit. */
  phase?: 'a' | 'b' | 'c';
  /** Key of one of the section's conductors. */
  conductor: Key;
  /** Offset from the structure's centre line, to the right positive. Unit: m. */
  horizontalM: number;
  /** Height above ground at the structure. Unit: m. */
  attachmentHeightM: number;
  /** Sag at mid-span. Unit: m. */
  sagM?: number;
  /** Subconductors in the bundle. Unit: none (count). */
  bundleCount?: number;
  /** Side of the bundle's polygon; more than 0 from two subconductors on. Unit: m. */
  bundleSpacingM?: number;
}

/** Three-phase power base of a pu or % value. Unit: MVA. The owner's when left out. */
export type BaseMva = number;

/** Phase-to-phase voltage base of a pu or % value. Unit: kV. The line's nominal voltage when left out. */
export type BaseKv = number;

/** A declared resistance. */
export interface DeclaredResistance {
  /** The number as declared. Unit: the one named in "unit". Unbounded: a wrong sign or size is a finding, not a fault. */
  value: number;
  unit: ResistanceUnit;
  baseMva?: BaseMva;
  baseKv?: BaseKv;
}

/** A declared reactance, or the inductance in its place. */
export interface DeclaredReactance {
  /** The number as declared. Unit: the one named in "unit". Unbounded: a wrong sign or size is a finding, not a fault. */
  value: number;
  unit: ReactanceUnit;
  baseMva?: BaseMva;
  baseKv?: BaseKv;
}

/** A declared susceptance (the whole charging, not one leg of the pi), or the capacitance in its place. */
export interface DeclaredSusceptance {
  /** The number as declared. Unit: the one named in "unit". Unbounded: a wrong sign or size is a finding, not a fault. */
  value: number;
  unit: SusceptanceUnit;
  baseMva?: BaseMva;
  baseKv?: BaseKv;
}

/** A stretch of line with one structure, one set of conductors and one earth; or a stretch of cable, taken as its maker declares it. */
export interface Section {
  /** overhead or cable. */
  kind?: 'overhead' | 'cable';
  /** Length of the section. Unit: km. */
  lengthKm: number;
  /** Resistivity of the earth below. Unit: ohm metre. The owner's when left out. */
  earthResistivityOhmM?: number;
  /** continuous: grounded at both ends and at the structures; segmented: insulated and grounded once, carrying no current. */
  groundWireBonding?: 'continuous' | 'segmented';
  /** The section's conductors by key. */
  conductors?: Record<string, Conductor>;
  /** Phase positions and ground wires. */
  positions?: Position[];
  /** A cable's values from its maker's sheet; a list when the line has two circuits that differ. */
  perLength?: CableCircuitValues[] | CableValues;
}

/** A cable's sequence values. A whole-length unit is for the whole section. */
export interface CableValues {
  /** Positive-sequence resistance. */
  r1: DeclaredResistance;
  /** Positive-sequence reactance. */
  x1: DeclaredReactance;
  /** Positive-sequence susceptance. */
  b1: DeclaredSusceptance;
  /** Zero-sequence resistance. */
  r0: DeclaredResistance;
  /** Zero-sequence reactance. */
  x0: DeclaredReactance;
  /** Zero-sequence susceptance. */
  b0: DeclaredSusceptance;
}

/** A cable's sequence values for one circuit. */
export interface CableCircuitValues {
  /** Number of the circuit, from 1. Unit: none (ordinal). */
  circuit: number;
  /** Positive-sequence resistance. */
  r1: DeclaredResistance;
  /** Positive-sequence reactance. */
  x1: DeclaredReactance;
  /** Positive-sequence susceptance. */
  b1: DeclaredSusceptance;
  /** Zero-sequence resistance. */
  r0: DeclaredResistance;
  /** Zero-sequence reactance. */
  x0: DeclaredReactance;
  /** Zero-sequence susceptance. */
  b0: DeclaredSusceptance;
}

/** A name as people say it, up to 120 characters. */
export type Name = string;

/** A key within one section, up to 60 characters. */
export type Key = string;

/** Per length: ohm/km, ohm/mi, ohm/kft. For the whole line: ohm, pu, %. */
export type ResistanceUnit = 'ohm/km' | 'ohm/mi' | 'ohm/kft' | 'ohm' | 'pu' | '%';

/** As for a resistance, and the inductance per length: mH/km, mH/mi (at the line's frequency). */
export type ReactanceUnit = 'ohm/km' | 'ohm/mi' | 'ohm/kft' | 'ohm' | 'pu' | '%' | 'mH/km' | 'mH/mi';

/** Per length: uS/km, uS/mi, and the capacitance nF/km, nF/mi, uF/km (at the line's frequency). For the whole line: uS, pu, %, Mvar (three-phase, at nominal voltage). */
export type SusceptanceUnit = 'uS/km' | 'uS/mi' | 'uS' | 'nF/km' | 'nF/mi' | 'uF/km' | 'pu' | '%' | 'Mvar';

/** A filing: the lines of an application, each with its geometry and the values declared for it. */
export interface Filing {
  /** Name and version of this format. */
  format?: 'filing/1';
  /** The lines. */
  lines: FilingLine[];
}
