import type { WeatherAssumptions } from '../engine/index';
import type { BandParameter, LineParameter, MutualParameter } from './parameters';

/**
 * A band of one parameter in one voltage class: two nested ranges. Outside `typical` an explanation is asked
 * for, outside `outer` an answer. Impedances in Ω/km, susceptances in µS/km.
 */
export interface Band {
  classKv: number;
  frequencyHz: number;
  parameter: BandParameter;
  typical: readonly [number, number];
  outer: readonly [number, number];
  /** Where the bounds come from, in words. */
  source: string;
  /** The same, bound by bound, where known. */
  bounds?: { typicalLow: string; typicalHigh: string; outer: string };
}

/** How far a declared value may part from the recomputed one: a share of the recomputed value. */
export interface Tolerance {
  /** The administrator's tolerance. */
  relative: number;
  /** The most that the inputs' uncertainty may widen it to. */
  cap: number;
}

/** A constant that carries a tolerance. */
export type ToleranceParameter = LineParameter | MutualParameter;

/** A tolerance for each constant that can be declared. */
export type Tolerances = Readonly<Record<ToleranceParameter, Tolerance>>;

/** How exactly each input is known; every recomputed value's plausible range follows from these. */
export interface Uncertainties {
  /** Heights, m; one shift common to a section. */
  heightM: number;
  /** Sags, m; one shift common to a section. */
  sagM: number;
  /** Horizontal offsets, m; each position alone. */
  offsetM: number;
  /** Conductor diameters, a share of the diameter. */
  diameterRelative: number;
  /** GMR, a share of it. */
  gmrRelative: number;
  /** A.c. resistance, a share of it. */
  acResistanceRelative: number;
  /** Conductor temperature, K. */
  temperatureK: number;
  /** Resistance of ground wires, a share of it. */
  groundWireResistanceRelative: number;
  /** Earth resistivity, a factor either way. */
  earthResistivityFactor: number;
}

/** The grid owner's own settings that a check needs. */
export interface OwnerSettings {
  /** Base of per-unit values where the filing names none, MVA. */
  baseMva: number;
  /** Earth resistivity where the filing gives none, Ω·m. */
  earthResistivityOhmM: number;
  /** Weather that declared ratings are weighed under; the basis of the published tables when absent. */
  weather?: WeatherAssumptions;
}

/** Everything a check is judged by. A check run keeps the versions of the set that it was made with. */
export interface RuleSet {
  bandsVersion: string;
  bands: readonly Band[];
  tolerancesVersion: string;
  tolerances: Tolerances;
  uncertainties: Uncertainties;
  owner: OwnerSettings;
}
