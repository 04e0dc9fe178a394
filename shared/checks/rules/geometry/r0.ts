import { circuitGeometryRule } from './contradicted';

/** Declared R0 against the geometry. */
export const geometryR0 = circuitGeometryRule(
  'r0',
  'R0 is within tolerance of what conductors, ground wires and earth give.',
  'Carson’s earth return (1926), ground wires eliminated',
);
