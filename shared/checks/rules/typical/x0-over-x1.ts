import { bandRule } from './outside-band';

/** X0/X1 lies in the band of the voltage class. */
export const typicalX0OverX1 = bandRule(
  'x0-over-x1',
  'x0OverX1',
  'X0 and X1',
  'X0/X1 lies in the band of the voltage class.',
);
