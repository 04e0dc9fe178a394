import { pairGeometryRule } from './coupling';

/** Declared R0m against the geometry. */
export const geometryR0m = pairGeometryRule('r0m');
