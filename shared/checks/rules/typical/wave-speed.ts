import { bandRule } from './outside-band';

/** ω/√(X1·B1) lies in the band of the voltage class: the best single check of X1 and B1 together. */
export const typicalWaveSpeed = bandRule(
  'wave-speed',
  'waveSpeed',
  'X1 and B1',
  'ω/√(X1·B1) lies in the band of the voltage class: the best single check of X1 and B1 together.',
);
