import { failureRule } from './failure';

/** Two wires closer than their radii. */
export const overlappingWires = failureRule(
  'overlapping-wires',
  ['overlapping-wires'],
  'Two wires are farther apart than the sum of their radii.',
  'Check offsets, heights and the bundle’s side.',
);
