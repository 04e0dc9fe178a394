import { bandRule } from './outside-band';

/** X0 lies in the band of the voltage class. */
export const typicalX0 = bandRule('x0', 'x0', 'X0', 'X0 lies in the band of the voltage class.');
