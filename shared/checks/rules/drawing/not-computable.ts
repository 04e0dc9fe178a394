import { failureRule } from './failure';

/** Geometry that cannot be computed for another reason. */
export const notComputable = failureRule(
  'not-computable',
  [
    'non-finite',
    'out-of-range',
    'conductor-data',
    'duplicate-phase',
    'missing-phase',
    'empty-section',
    'empty-line',
    'circuit-mismatch',
    'ill-conditioned',
  ],
  'The geometry can be computed.',
  'Nothing is recomputed until this is put right.',
);
