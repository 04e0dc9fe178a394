import { circuitGeometryRule } from './contradicted';

/** Declared X0 against the geometry. */
export const geometryX0 = circuitGeometryRule(
  'x0',
  'X0 is within tolerance of what spacing, ground wires and earth give.',
  'Carson’s earth return (1926), ground wires eliminated',
);
