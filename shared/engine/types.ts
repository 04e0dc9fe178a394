/**
 * What the engine takes and gives. Plain data in, a typed result out: nothing here throws, nothing is NaN.
 * Units stand in the names; where they cannot (short symbols of the trade) they stand in the comment.
 */

/** Data of one conductor. `handbook` needs gmrMm and acResistanceOhmPerKm, `tube` needs dcResistance20OhmPerKm and temperatureC. */
export interface ConductorData {
  name?: string;
  model: 'handbook' | 'tube';
  diameterMm: number;
  /** Diameter of the core that carries no current, 0 or absent for a solid wire. */
  coreDiameterMm?: number;
  gmrMm?: number;
  /** Tabled a.c. resistance at `temperatureC`. */
  acResistanceOhmPerKm?: number;
  dcResistance20OhmPerKm?: number;
  temperatureC?: number;
  /** At 20 °C; 0.00403 (aluminium) when absent. */
  temperatureCoefficientPerK?: number;
}

/** The three phases of a circuit. */
export type Phase = 'a' | 'b' | 'c';

/** Where a phase's bundle hangs; offsets and heights are of the bundle's centre. */
export interface PhasePosition {
  kind: 'phase';
  /** Numbered from 1 without gaps. */
  circuit: number;
  phase: Phase;
  conductor: ConductorData;
  horizontalM: number;
  attachmentHeightM: number;
  sagM: number;
  bundleCount: number;
  /** Side of the regular polygon; 0 for a single conductor. */
  bundleSpacingM: number;
}

/** Where a ground wire hangs. */
export interface GroundWirePosition {
  kind: 'ground-wire';
  conductor: ConductorData;
  horizontalM: number;
  attachmentHeightM: number;
  sagM: number;
}

/** One structure, one set of conductors and one earth over a length. */
export interface OverheadSection {
  kind: 'overhead';
  lengthKm: number;
  earthResistivityOhmM: number;
  /** `continuous`: grounded at both ends, carries current. `segmented`: carries none, is still at ground potential. */
  groundWireBonding: 'continuous' | 'segmented';
  /** In the filing's order: `Where.position` indexes this list. */
  positions: readonly (PhasePosition | GroundWirePosition)[];
}

/** A stretch of cable, taken as its maker declares it. */
export interface CableSection {
  kind: 'cable';
  lengthKm: number;
  /** One entry a circuit. */
  perLength: readonly SequenceConstants[];
}

export type LineSection = OverheadSection | CableSection;

/** A line: one or more sections in series. */
export interface LineInput {
  frequencyHz: number;
  sections: readonly LineSection[];
}

/** Sequence constants of one circuit: r, x in Ω/km, b in µS/km. */
export interface SequenceConstants {
  r1: number;
  x1: number;
  b1: number;
  r0: number;
  x0: number;
  b0: number;
}

/** The six headline values, in the order in which they are always listed. */
export const SEQUENCE_KEYS = ['r1', 'x1', 'b1', 'r0', 'x0', 'b0'] as const;
export type SequenceKey = (typeof SEQUENCE_KEYS)[number];

/** Zero-sequence coupling of two circuits: Ω/km and µS/km (b0m is the off-diagonal element, negative). */
export interface Mutual {
  circuits: [number, number];
  r0m: number;
  x0m: number;
  b0m: number;
}

/** Constants of one section, one entry a circuit in the order of their numbers. */
export interface SectionConstants {
  circuits: SequenceConstants[];
  mutual: Mutual[];
}

/** A whole line as one pi: r, x in Ω; b is the total (both legs) in µS. */
export interface PiTotals {
  r: number;
  x: number;
  b: number;
  r0: number;
  x0: number;
  b0: number;
}

/** Constants of a line: per-length values are length-weighted means over the sections. */
export interface LineConstants extends SectionConstants {
  lengthKm: number;
  /** Exact equivalent pi of the cascaded sections, per circuit. */
  equivalent: PiTotals[];
  /** Nominal pi: the plain sums of length × per-length value. */
  nominal: PiTotals[];
}

/** Complex number as [real, imaginary]. */
export type Pair = [number, number];

/** |Z21/Z11| and |Z01/Z11| of a circuit that is not transposed. */
export interface Unbalance {
  negative: number;
  zero: number;
}

/** Full matrices of a section; rows in the order circuit 1 a b c, circuit 2 a b c … (sequence: 0 + − a circuit). */
export interface SectionMatrices {
  phaseImpedanceOhmPerKm: Pair[][];
  phaseSusceptanceMicrosiemensPerKm: number[][];
  sequenceImpedanceOhmPerKm: Pair[][];
  sequenceSusceptanceMicrosiemensPerKm: Pair[][];
  unbalance: Unbalance[];
}

/** Where in the input a failure sits; all indices count from 0. */
export interface Where {
  section?: number;
  position?: number;
  /** The second position when two are at odds. */
  other?: number;
  field?: string;
}

/** Why nothing could be computed. */
export type FailureReason =
  | 'coincident-wires'
  | 'overlapping-wires'
  | 'wire-in-ground'
  | 'non-finite'
  | 'out-of-range'
  | 'conductor-data'
  | 'duplicate-phase'
  | 'missing-phase'
  | 'empty-section'
  | 'empty-line'
  | 'circuit-mismatch'
  | 'ill-conditioned';

export interface Failure {
  ok: false;
  reason: FailureReason;
  where: Where;
  /** One sentence: what is there and what is wanted. */
  detail: string;
  /** Estimate of the condition number, with `ill-conditioned`. */
  condition?: number;
}

export interface Success<T> {
  ok: true;
  value: T;
}

/** Either a value or the reason why there is none. */
export type Result<T> = Success<T> | Failure;
