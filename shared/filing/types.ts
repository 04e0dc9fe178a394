/**
 * What a filing becomes once it has been read: defaults filled in, library data copied, declared values
 * in SI beside the words in which they were declared, and a JSON Pointer for whatever a finding may name.
 */
import type { LineInput, OverheadSection, CableSection } from '../engine/types';
import type { FilingLine, DeclaredCircuit } from '../contracts/filing.generated';

/** The six values declared of a circuit. */
export type DeclaredKey = 'r1' | 'x1' | 'b1' | 'r0' | 'x0' | 'b0';

/** The three values declared of the coupling of two circuits. */
export type MutualKey = 'r0m' | 'x0m' | 'b0m';

/** A value as it was declared and what it comes to. SI here is Ω and Ω/km, µS and µS/km. */
export interface DeclaredValue {
  /** The number as declared, in `unit`. */
  value: number;
  /** The unit as declared, one of the closed list. */
  unit: string;
  /** Whether the unit is per length or of the whole line. */
  form: 'per-length' | 'whole-line';
  /** Ω/km or µS/km; of a whole-line value its total ÷ the line's length. */
  perKm: number;
  /** Ω or µS; of a per-length value perKm × the line's length. */
  total: number;
  /** Half a unit of the last digit as written, in Ω/km or µS/km. */
  halfDigitPerKm: number;
  /** The digits as they were written. */
  written: string;
  /** JSON Pointer of the declared value, such as `/lines/0/declared/0/x1`. */
  pointer: string;
  /** MVA base in use, of pu and % values. */
  baseMva?: number;
  /** kV base in use, of pu and % values. */
  baseKv?: number;
}

/** A declared circuit. */
export interface NormalisedCircuit {
  /** Number of the circuit, from 1. */
  circuit: number;
  /** JSON Pointer of the entry. */
  pointer: string;
  declared: Partial<Record<DeclaredKey, DeclaredValue>>;
  circuitId?: string;
  ratingA?: number;
  maxTemperatureC?: number;
  ratings: readonly { season: string; continuousA: number; emergencyA?: number }[];
  basis?: DeclaredCircuit['basis'];
}

/** Declared coupling of two circuits. */
export interface NormalisedMutual {
  circuits: [number, number];
  pointer: string;
  declared: Partial<Record<MutualKey, DeclaredValue>>;
}

/** What every section has. */
interface SectionBase {
  /** JSON Pointer of the section. */
  pointer: string;
  lengthKm: number;
}

/** An overhead section with its geometry, ready for the engine. */
export interface NormalisedOverhead extends SectionBase {
  kind: 'overhead';
  input: OverheadSection;
  /** The resistivity was left out and is the owner's: a Note. */
  resistivityIsOwners: boolean;
}

/** An overhead section that comes without conductors and positions: `drawing.geometry-missing`. */
export interface NormalisedGeometryMissing extends SectionBase {
  kind: 'geometry-missing';
  earthResistivityOhmM: number;
  groundWireBonding: 'continuous' | 'segmented';
  resistivityIsOwners: boolean;
}

/** A cable section, taken as declared: a Note. */
export interface NormalisedCable extends SectionBase {
  kind: 'cable';
  input: CableSection;
}

/** A section of whatever kind; `kind` tells them apart. */
export type NormalisedSection = NormalisedOverhead | NormalisedGeometryMissing | NormalisedCable;

/** One line of a filing that has been read. */
export interface NormalisedLine {
  /** JSON Pointer of the line, such as `/lines/0`. */
  pointer: string;
  name: string;
  from: string;
  to: string;
  nominalVoltageKv: number;
  frequencyHz: 50 | 60;
  transposed: boolean;
  /** Sum over the sections. */
  lengthKm: number;
  /** Share of the length that is cable, 0 to 1. */
  cableShare: number;
  /** Circuits on the structure, declared or not. */
  circuitCount: number;
  sections: readonly NormalisedSection[];
  /** The engine's input; null while a section owes its geometry. */
  engineInput: LineInput | null;
  /** The declared circuits, in the filing's order. */
  circuits: readonly NormalisedCircuit[];
  mutual: readonly NormalisedMutual[];
  /** What a revision freezes of the line; `readLine` makes the same of it again. */
  sheet: LineSheet;
}

/** A line as it is kept: complete in itself, with what reading it again must know. Pointers count from the line. */
export interface LineSheet {
  /** The line in the filing's own format, defaults filled in and library data copied. */
  line: FilingLine;
  /** Digits as written, where they differ from the number's shortest form. */
  written: WrittenDigits;
  /** Pointers of values that the owner's settings filled in. */
  assumed: readonly string[];
}

/** Something assumed or done in reading that is worth knowing; it is no fault. */
export interface Notice {
  code: 'earth-resistivity-default' | 'base-default' | 'library-copied' | 'encoding-windows-1252' | 'dialect';
  /** JSON Pointer of what it is about, where there is one. */
  pointer?: string;
  /** One sentence. */
  message: string;
}

/** A filing that has been read without a fault. */
export interface NormalisedFiling {
  lines: readonly NormalisedLine[];
}

/** Digits as they stood in the text, by JSON Pointer, where they differ from the number's shortest form. */
export type WrittenDigits = Readonly<Record<string, string>>;

/** What the owner of the grid sets for values that a filing leaves out. */
export interface OwnerDefaults {
  baseMva: number;
  earthResistivityOhmM: number;
}
