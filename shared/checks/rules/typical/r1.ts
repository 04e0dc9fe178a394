import { bandRule } from './outside-band';

/** R1 lies in the band of the voltage class. */
export const typicalR1 = bandRule('r1', 'r1', 'R1', 'R1 lies in the band of the voltage class.');
