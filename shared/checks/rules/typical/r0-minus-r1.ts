import { bandRule } from './outside-band';

/** R0 − R1, the resistance of the return path, lies in its band: a strong check of R0. */
export const typicalR0MinusR1 = bandRule(
  'r0-minus-r1',
  'r0MinusR1',
  'R0 and R1',
  'R0 − R1, the resistance of the return path, lies in its band: a strong check of R0.',
);
