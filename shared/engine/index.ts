/**
 * Front door of the line-constants engine: plain data in, typed results out, never NaN, never an exception.
 * The rest of the product imports the engine from here only.
 */

/** Version of the engine's arithmetic, kept with every check run: it changes when any result can change. */
export const ENGINE_VERSION = '1.0.0';

export * from './types';
export { solveSection } from './section';
export { solveLine } from './line';
export { sectionMatrices } from './matrices';
export { sensitivities, uncertainty } from './uncertainty';
export * from './sensitivity-types';
export { derive, perUnit, type Derived } from './derived';
export { handCheck, type HandCheck, type ShortcutCause, type ShortcutValue } from './hand-check';
export { impliedGeometry, type ImpliedGeometry, type ImpliedGeometryInput } from './implied-geometry';
export {
  ampacity,
  circuitAmpacity,
  type Ampacity,
  type AmpacityInput,
  type CircuitAmpacity,
} from './ampacity';
export type { WeatherAssumptions } from './weather';
export { phaseCascade, type PhaseCascade } from './phase-cascade';
export { bundleOffsets } from './wires';
export { conductorResistanceOhmPerKm, dcResistanceOhmPerKm } from './conductor';
export { logarithmicGrid, sweep, withSkinEffect, type SweepCircuit, type SweepTable } from './sweep';
