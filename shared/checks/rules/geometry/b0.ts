import { circuitGeometryRule } from './contradicted';

/** Declared B0 against the geometry. */
export const geometryB0 = circuitGeometryRule(
  'b0',
  'B0 is within tolerance of what heights and ground wires give.',
  'potential coefficients of every wire with images, ground wires at zero potential',
);
