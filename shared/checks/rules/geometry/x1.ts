import { circuitGeometryRule } from './contradicted';

/** Declared X1 against the geometry. */
export const geometryX1 = circuitGeometryRule(
  'x1',
  'X1 is within tolerance of what spacing, GMR and bundle give.',
  'full matrix of every wire with images and earth return',
);
