/**
 * The line as it stands in the form. The tree mirrors the filing's line member by member, so that a
 * JSON Pointer into the filing names the same place here; only the leaves differ: they hold the text
 * as it was typed and the unit that was chosen for it, complete or not.
 */

/** A number as typed, in the unit that its writer chose. */
export interface Typed {
  text: string;
  unit: string;
}

/** A declared value: per-unit values carry the bases they stand on. */
export interface DeclaredTyped extends Typed {
  baseMva: string;
  baseKv: string;
}

export const SEQUENCE_KEYS = ['r1', 'x1', 'b1', 'r0', 'x0', 'b0'] as const;
export type SequenceKey = (typeof SEQUENCE_KEYS)[number];
export const MUTUAL_KEYS = ['r0m', 'x0m', 'b0m'] as const;
export type MutualKey = (typeof MUTUAL_KEYS)[number];
export type SequenceTyped = Record<SequenceKey, DeclaredTyped>;

export interface ConductorForm {
  source: 'library' | 'own';
  library: string;
  name: string;
  model: 'handbook' | 'tube';
  diameterMm: Typed;
  coreDiameterMm: Typed;
  gmrMm: Typed;
  acResistanceOhmPerKm: Typed;
  dcResistance20OhmPerKm: Typed;
  temperatureC: Typed;
  temperatureCoefficientPerK: Typed;
  /** Kept as it was typed and never filed: it only proposes the d.c. resistance. */
  aluminiumArea: Typed;
}

export type PhaseName = 'a' | 'b' | 'c';

interface HangingForm {
  conductor: string;
  horizontalM: Typed;
  attachmentHeightM: Typed;
  sagM: Typed;
}
export interface PhaseForm extends HangingForm {
  kind: 'phase';
  circuit: number;
  phase: PhaseName;
  bundleCount: string;
  bundleSpacingM: Typed;
}
export interface GroundWireForm extends HangingForm {
  kind: 'ground-wire';
}
export type PositionForm = PhaseForm | GroundWireForm;

export interface SectionForm {
  kind: 'overhead' | 'cable';
  lengthKm: Typed;
  earthResistivityOhmM: Typed;
  groundWireBonding: 'continuous' | 'segmented';
  /** False for an overhead section that is filed without its geometry. */
  hasGeometry: boolean;
  conductors: Record<string, ConductorForm>;
  positions: PositionForm[];
  perLength: SequenceTyped[];
}

export interface RatingForm {
  season: string;
  continuousA: Typed;
  emergencyA: Typed;
}

export interface BasisForm {
  kind: string;
  status: string;
  engineer: string;
  date: string;
}

export interface DeclaredForm extends SequenceTyped {
  circuit: number;
  circuitId: string;
  ratingA: Typed;
  maxTemperatureC: Typed;
  ratings: RatingForm[];
  basis: BasisForm;
}

export type MutualForm = Record<MutualKey, DeclaredTyped>;

export interface LineForm {
  name: string;
  from: string;
  to: string;
  nominalVoltageKv: Typed;
  frequencyHz: string;
  transposed: boolean;
  circuits: 1 | 2;
  sections: SectionForm[];
  declared: DeclaredForm[];
  declaredMutual: MutualForm;
}

/** A field's text as it was typed, with its unit where that is not the filing's own. */
export interface KeptText {
  text: string;
  unit?: string;
}

/** What was typed where the filing's number alone would lose it, by JSON Pointer within the line. */
export type AsTyped = Record<string, KeptText>;

/** A step into the form's tree: member names and list indices, as in a JSON Pointer. */
export type FormPath = readonly (string | number)[];
