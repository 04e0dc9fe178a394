import type { Tolerances, Uncertainties } from '../rule-set';

/** Version of the default tolerances and uncertainties; changes whenever one of them does. */
export const DEFAULT_TOLERANCES_VERSION = 'default-1';

/**
 * Default tolerances, shares of the recomputed value. Geometry pins X1 and B1 within about half a per cent, so
 * that a mistaken GMR (3 % with one conductor) must show; R0 and X0 hang on soil and ground wires.
 * The couplings take the tolerance of their self values with a wider cap: they are small differences.
 */
export const DEFAULT_TOLERANCES: Tolerances = {
  r1: { relative: 0.05, cap: 0.1 },
  x1: { relative: 0.015, cap: 0.025 },
  b1: { relative: 0.015, cap: 0.025 },
  r0: { relative: 0.1, cap: 0.2 },
  x0: { relative: 0.06, cap: 0.1 },
  b0: { relative: 0.03, cap: 0.05 },
  r0m: { relative: 0.1, cap: 0.2 },
  x0m: { relative: 0.06, cap: 0.15 },
  b0m: { relative: 0.06, cap: 0.15 },
};

/** Default uncertainties of the inputs. */
export const DEFAULT_UNCERTAINTIES: Uncertainties = {
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
