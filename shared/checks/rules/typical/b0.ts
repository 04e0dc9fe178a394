import { bandRule } from './outside-band';

/** B0 lies in the band of the voltage class. */
export const typicalB0 = bandRule('b0', 'b0', 'B0', 'B0 lies in the band of the voltage class.');
