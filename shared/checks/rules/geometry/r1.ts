import { circuitGeometryRule } from './contradicted';

/** Declared R1 against the geometry. */
export const geometryR1 = circuitGeometryRule(
  'r1',
  'R1 is within tolerance of the a.c. resistance of the bundles filed.',
  'conductor data at the temperature filed; ground wires add a little through coupling',
);
