/** Sequence constants of one circuit that can be declared: Ω/km for r and x, µS/km for b. */
export const LINE_PARAMETERS = ['r1', 'x1', 'b1', 'r0', 'x0', 'b0'] as const;

/** One of the six sequence constants of a circuit. */
export type LineParameter = (typeof LINE_PARAMETERS)[number];

/** Zero-sequence coupling between two circuits that can be declared: Ω/km and µS/km. */
export const MUTUAL_PARAMETERS = ['r0m', 'x0m', 'b0m'] as const;

/** One of the three zero-sequence couplings. */
export type MutualParameter = (typeof MUTUAL_PARAMETERS)[number];

/** What bands are given for: five of the six constants (R0 as its excess over R1) and their ratios. */
export const BAND_PARAMETERS = [
  'r1',
  'x1',
  'b1',
  'r0MinusR1',
  'x0',
  'b0',
  'x1OverR1',
  'x0OverX1',
  'r0OverR1',
  'b0OverB1',
  'surgeImpedanceOhm',
  'waveSpeed',
] as const;

/** A parameter that a band can be given for. */
export type BandParameter = (typeof BAND_PARAMETERS)[number];

/** Any parameter that a finding can be about. */
export type FindingParameter = LineParameter | MutualParameter | BandParameter | 'ratingA';

interface ParameterWords {
  /** As a sentence names it: "X1". */
  label: string;
  /** Unit as printed behind a figure, empty for a ratio. */
  unit: string;
}

/** Name and unit of each parameter, for sentences, tables and charts. */
export const PARAMETER_WORDS: Readonly<Record<FindingParameter, ParameterWords>> = {
  r1: { label: 'R1', unit: 'Ω/km' },
  x1: { label: 'X1', unit: 'Ω/km' },
  b1: { label: 'B1', unit: 'µS/km' },
  r0: { label: 'R0', unit: 'Ω/km' },
  x0: { label: 'X0', unit: 'Ω/km' },
  b0: { label: 'B0', unit: 'µS/km' },
  r0m: { label: 'R0m', unit: 'Ω/km' },
  x0m: { label: 'X0m', unit: 'Ω/km' },
  b0m: { label: 'B0m', unit: 'µS/km' },
  r0MinusR1: { label: 'R0 − R1', unit: 'Ω/km' },
  x1OverR1: { label: 'X1/R1', unit: '' },
  x0OverX1: { label: 'X0/X1', unit: '' },
  r0OverR1: { label: 'R0/R1', unit: '' },
  b0OverB1: { label: 'B0/B1', unit: '' },
  surgeImpedanceOhm: { label: 'Surge impedance', unit: 'Ω' },
  waveSpeed: { label: 'Wave speed', unit: 'of light’s' },
  ratingA: { label: 'Rating', unit: 'A' },
};

/** The declared constants that a derived parameter is made of; a constant is made of itself. */
export const MADE_OF: Readonly<Record<FindingParameter, readonly (LineParameter | MutualParameter)[]>> = {
  r1: ['r1'],
  x1: ['x1'],
  b1: ['b1'],
  r0: ['r0'],
  x0: ['x0'],
  b0: ['b0'],
  r0m: ['r0m'],
  x0m: ['x0m'],
  b0m: ['b0m'],
  r0MinusR1: ['r0', 'r1'],
  x1OverR1: ['x1', 'r1'],
  x0OverX1: ['x0', 'x1'],
  r0OverR1: ['r0', 'r1'],
  b0OverB1: ['b0', 'b1'],
  surgeImpedanceOhm: ['x1', 'b1'],
  waveSpeed: ['x1', 'b1'],
  ratingA: [],
};

/** True for one of the six sequence constants. */
export function isLineParameter(name: string): name is LineParameter {
  return (LINE_PARAMETERS as readonly string[]).includes(name);
}
