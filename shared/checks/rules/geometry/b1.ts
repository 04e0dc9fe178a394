import { circuitGeometryRule } from './contradicted';

/** Declared B1 against the geometry. */
export const geometryB1 = circuitGeometryRule(
  'b1',
  'B1 is within tolerance of what spacing, diameter and height give.',
  'potential coefficients of every wire with images',
);
