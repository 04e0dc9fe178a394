import { bandRule } from './outside-band';

/** B0/B1 lies in the band of the voltage class. */
export const typicalB0OverB1 = bandRule(
  'b0-over-b1',
  'b0OverB1',
  'B0 and B1',
  'B0/B1 lies in the band of the voltage class.',
);
