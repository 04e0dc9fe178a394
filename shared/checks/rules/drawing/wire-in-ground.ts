import { failureRule } from './failure';

/** A wire at or below ground. */
export const wireInGround = failureRule(
  'wire-in-ground',
  ['wire-in-ground'],
  'Every wire hangs above ground, its sag included.',
  'Check attachment height and sag.',
);
