import type { LibraryConductor } from '../library/types';
import type { FindingParameter, LineParameter, MutualParameter } from './parameters';

/** The four families of findings. */
export type Family = 'physics' | 'geometry' | 'typical' | 'drawing';

/** How much a finding asks for, heaviest first. */
export const GRADES = ['must-answer', 'explain', 'note'] as const;

/** One of the three grades. */
export type Grade = (typeof GRADES)[number];

/** Every slip that can be offered as a cause. */
export const CAUSE_CODES = [
  'per-mile',
  'per-km',
  'total',
  'per-length',
  'long-line-form',
  'half-charging',
  'double-charging',
  'frequency',
  'capacitance',
  'base-mva',
  'base-kv',
  'phase-to-neutral-base',
  'decimal-shift',
  'r-x-swapped',
  'sequence-swapped',
  'x-b-swapped',
  'dc-resistance',
  'resistance-at-20c',
  'radius-for-gmr',
  'diameter-for-radius',
  'gmr-for-radius',
  'single-conductor',
  'bundle-count',
  'bundle-spacing',
  'arithmetic-spacing',
  'no-ground-wires',
  'tower-height',
  'earth-resistivity',
  'other-conductor',
  'feet-for-metres',
  'inches-for-millimetres',
  'centimetres-for-metres',
  'position',
] as const;

/** The code of a cause. */
export type CauseCode = (typeof CAUSE_CODES)[number];

/** A slip that would explain findings. */
export interface Cause {
  code: CauseCode;
  /** Where the slip lies: in the declared values or in the filed geometry. */
  in: 'declared' | 'geometry';
  /** The declared constants that it brings back. */
  explains: (LineParameter | MutualParameter)[];
  /**
   * Declared slips: the value that each explained constant gets, Ω/km or µS/km. Geometry slips: the corrected
   * entries, named from `where`, in the unit of their field.
   */
  corrected: Record<string, number>;
  /** JSON Pointer of the place of a geometry slip. */
  where?: string;
  /** The largest remaining |difference| ÷ recomputed among the explained constants. */
  residual: number;
  /** Fitted to wave speed and band because there is no geometry. */
  possible?: true;
  /** What is assumed, in one sentence. */
  sentence: string;
}

/** Something that the check noticed. */
export interface Finding {
  code: string;
  family: Family;
  grade: Grade;
  parameter?: FindingParameter;
  /** Ω/km, µS/km, Ω, A or a ratio, after the parameter. */
  declared?: number;
  recomputed?: number;
  /** (declared − recomputed) ÷ recomputed. */
  deviation?: number;
  /** Tolerance in use, a share of the recomputed value, half a unit of the last digit included. */
  tolerance?: number;
  /** The administrator's tolerance, the one that the inputs explain (uncapped) and the input that dominates it. */
  toleranceOf?: { administrator: number; inputs: number; dominantInput: string; rounding: number };
  /** Typical and outer range that it was weighed against. */
  band?: { classKv: number; typical: readonly [number, number]; outer: readonly [number, number] };
  /** JSON Pointer into the filing. */
  where: string;
  message: string;
  circuit?: number;
  /** Index of the section, from 0. */
  section?: number;
  /** Index of the position within its section, from 0. */
  position?: number;
  /** Findings that one matter explains share a group. */
  group: number;
  /** The constant that it follows from; such a finding is a Note and is not counted again. */
  follows?: FindingParameter;
  /** At most three a group, best first; each stands at the findings of what it explains. */
  causes: Cause[];
}

/** The six constants and the two derived values that findings use. */
export type RecomputedValues = Record<LineParameter, number> & {
  surgeImpedanceOhm: number;
  waveSpeed: number;
};

/** A whole line's equivalent pi: Ω, and µS for the whole charging. */
export interface EquivalentPi {
  r: number;
  x: number;
  b: number;
  r0: number;
  x0: number;
  b0: number;
}

/** The constants at a frequency that was asked for. */
export type AtFrequency = { frequencyHz: number } & Record<LineParameter, number>;

/** What the declared X1 and B1 would need, and what the class has. */
export interface ImpliedGeometry {
  /** Geometric mean spacing of the phases, m. */
  meanSpacingM: number;
  /** GMR of one subconductor, mm. */
  gmrMm: number;
  /** The same two of the filed geometry. */
  filed: { meanSpacingM: number; gmrMm: number };
  /** Usual phase spacing of the voltage, m; null outside the table. */
  typicalSpacingM: readonly [number, number] | null;
  sentence: string;
}

/** How one value was weighed. */
export interface Weighed {
  parameter: FindingParameter;
  declared: number | null;
  recomputed: number | null;
  range: readonly [number, number] | null;
  deviation: number | null;
  tolerance: number | null;
  typical: readonly [number, number] | null;
  outer: readonly [number, number] | null;
  /** Worst grade that it got; null in balance. */
  grade: Grade | null;
  follows: FindingParameter | null;
}

/** The check of one circuit. */
export interface CircuitReport {
  circuit: number;
  declared: Partial<Record<LineParameter, number>>;
  /** Null when the geometry is missing or cannot be computed. */
  recomputed: RecomputedValues | null;
  equivalent: EquivalentPi | null;
  /** [low, high] of each constant. */
  range: Record<LineParameter, [number, number]> | null;
  frequencies?: AtFrequency[];
  findings: Finding[];
  implied: ImpliedGeometry | null;
  values: Weighed[];
}

/** Zero-sequence coupling of two circuits, Ω/km and µS/km. */
export interface MutualReport {
  circuits: [number, number];
  r0m: number;
  x0m: number;
  b0m: number;
}

/** Phase matrices per km of a one-section line. */
export interface MatricesReport {
  phaseImpedanceOhmPerKm: [number, number][][];
  phaseSusceptanceMicrosiemensPerKm: number[][];
}

/** The check of one line. */
export interface LineReport {
  name: string;
  /** The voltage class that it was weighed against; null when none is near. */
  bandClassKv: number | null;
  circuits: CircuitReport[];
  /** Findings of a section, a position or a pair of circuits. */
  findings: Finding[];
  mutual: MutualReport[];
  matrices?: MatricesReport;
}

/** The check of a filing: what `check --json` prints. */
export interface CheckReport {
  /** Version of the engine. */
  engine: string;
  bands: string;
  tolerances: string;
  lines: LineReport[];
}

/** What a check is asked for beside the findings. */
export interface CheckOptions {
  /** Frequencies, Hz, at which the constants are wanted too. */
  frequenciesHz?: readonly number[];
  /** Whether phase matrices of one-section lines are wanted. */
  matrices?: boolean;
  /** Causes are left out when false; true when absent. */
  causes?: boolean;
  /** Conductors that may have been taken for the filed one; the starting library when absent. */
  library?: readonly LibraryConductor[];
}
