import { pairGeometryRule } from './coupling';

/** Declared X0m against the geometry. */
export const geometryX0m = pairGeometryRule('x0m');
