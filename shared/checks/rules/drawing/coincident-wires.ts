import { failureRule } from './failure';

/** Two wires at one place. */
export const coincidentWires = failureRule(
  'coincident-wires',
  ['coincident-wires'],
  'No two wires hang at one place.',
  'Check offset and height of both.',
);
