import { bandRule } from './outside-band';

/** √(X1/B1) lies in the band of the voltage class. */
export const typicalSurgeImpedance = bandRule(
  'surge-impedance',
  'surgeImpedanceOhm',
  'X1 and B1',
  '√(X1/B1) lies in the band of the voltage class.',
);
