import { bandRule } from './outside-band';

/** X1/R1 lies in the band of the voltage class. */
export const typicalX1OverR1 = bandRule(
  'x1-over-r1',
  'x1OverR1',
  'X1 and R1',
  'X1/R1 lies in the band of the voltage class.',
);
