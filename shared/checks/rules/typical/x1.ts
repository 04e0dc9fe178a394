import { bandRule } from './outside-band';

/** X1 lies in the band of the voltage class. */
export const typicalX1 = bandRule('x1', 'x1', 'X1', 'X1 lies in the band of the voltage class.');
