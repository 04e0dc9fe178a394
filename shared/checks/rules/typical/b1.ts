import { bandRule } from './outside-band';

/** B1 lies in the band of the voltage class. */
export const typicalB1 = bandRule('b1', 'b1', 'B1', 'B1 lies in the band of the voltage class.');
