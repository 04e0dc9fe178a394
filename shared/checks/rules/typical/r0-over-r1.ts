import { bandRule } from './outside-band';

/** R0/R1 lies in its band: a weak check, since 1.4 to 60 is physical. */
export const typicalR0OverR1 = bandRule(
  'r0-over-r1',
  'r0OverR1',
  'R0 and R1',
  'R0/R1 lies in its band: a weak check, since 1.4 to 60 is physical.',
);
