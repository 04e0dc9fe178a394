import type { ConductorData, LineConstants, SequenceConstants, SequenceKey, Where } from './types';

/** How far each input may be off (one value of the administrator's settings a field). */
export interface InputUncertainties {
  /** Heights, one shift common to a section, ± m. */
  heightM: number;
  /** Sags, one shift common to a section, ± m. */
  sagM: number;
  /** Each horizontal offset alone, ± m. */
  offsetM: number;
  /** Outer diameter of a conductor, ± share. */
  diameterRelative: number;
  /** GMR of a handbook conductor, ± share. */
  gmrRelative: number;
  /** Resistance of a phase conductor, ± share. */
  acResistanceRelative: number;
  /** Temperature of a phase conductor, ± K. */
  temperatureK: number;
  /** Resistance of a ground wire, ± share. */
  groundWireResistanceRelative: number;
  /** Resistivity of the earth, × or ÷ this factor. */
  earthResistivityFactor: number;
}

/** The product's defaults; the administrator's settings take their place. */
export const DEFAULT_INPUT_UNCERTAINTIES: Readonly<InputUncertainties> = {
  heightM: 0.3,
  sagM: 0.5,
  offsetM: 0.1,
  diameterRelative: 0.005,
  gmrRelative: 0.01,
  acResistanceRelative: 0.02,
  temperatureK: 10,
  groundWireResistanceRelative: 0.1,
  earthResistivityFactor: 3,
};

/** The inputs that can be off. */
export type UncertainInput =
  | 'height'
  | 'sag'
  | 'offset'
  | 'diameter'
  | 'gmr'
  | 'ac-resistance'
  | 'temperature'
  | 'ground-wire-resistance'
  | 'earth-resistivity';

/** One input's slopes: how every headline value moves per unit of it. */
export interface Sensitivity {
  input: UncertainInput;
  /** Unit of the input: m, K, or the share by which it grows (`relative`, a unit of its logarithm). */
  unit: 'm' | 'K' | 'relative';
  where: Where;
  /** Conductor whose data move, for inputs that belong to one. */
  conductor?: ConductorData;
  /** Slopes by circuit, Ω/km and µS/km per unit. */
  circuits: SequenceConstants[];
  /** Slopes of the zero-sequence mutuals in the order of `SectionConstants.mutual`. */
  mutual: { r0m: number; x0m: number; b0m: number }[];
}

/** Range of one value. */
export interface Spread {
  value: number;
  /** How far the value moves when each input moves within its uncertainty, combined in quadrature. */
  halfRange: number;
  low: number;
  high: number;
  /** The input that moves it most; null when none does. */
  dominant: UncertainInput | null;
  /** Section and position of the dominant input, where it has one. */
  where: Where;
}

/** Ranges of a line's per-length values, with the values themselves. */
export interface LineUncertainty {
  constants: LineConstants;
  circuits: Record<SequenceKey, Spread>[];
  mutual: { circuits: [number, number]; r0m: Spread; x0m: Spread; b0m: Spread }[];
}
