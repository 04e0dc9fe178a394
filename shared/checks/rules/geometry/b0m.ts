import { pairGeometryRule } from './coupling';

/** Declared B0m against the geometry. */
export const geometryB0m = pairGeometryRule('b0m');
