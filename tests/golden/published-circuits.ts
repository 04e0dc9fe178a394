/**
 * Published line and circuit data, copied from the sources named; Ω/km, µS/km (total charging), Hz.
 * Tags: T read in public text or data, C computed, M from memory.
 */

/** Kundur, Power System Stability and Control, table 6.1 (M; internally consistent by arithmetic), 60 Hz. */
export const KUNDUR_TABLE: readonly (readonly [kv: number, r1: number, x1: number, b1: number])[] = [
  [230, 0.05, 0.488, 3.371],
  [345, 0.037, 0.367, 4.518],
  [500, 0.028, 0.325, 5.2],
  [765, 0.012, 0.329, 4.978],
  [1100, 0.005, 0.292, 5.544],
];

/**
 * An open table of standard overhead line types, 50 Hz (T; b computed from c). The rows marked suspect are faster than
 * light by more than rounding: their capacitance was estimated.
 */
export const STANDARD_TYPES: readonly (readonly [
  kv: number,
  r1: number,
  x1: number,
  b1: number,
  isSuspect?: true,
])[] = [
  [110, 0.5939, 0.46, 2.513],
  [110, 0.4132, 0.45, 2.639],
  [110, 0.306, 0.44, 2.717],
  [110, 0.2376, 0.43, 2.67],
  [110, 0.194, 0.41, 2.749],
  [110, 0.1571, 0.4, 2.765],
  [110, 0.1188, 0.39, 2.827],
  [110, 0.0949, 0.38, 2.89],
  [110, 0.059, 0.37, 3.063],
  [110, 0.042, 0.36, 3.126],
  [220, 0.059, 0.285, 3.142, true],
  [220, 0.042, 0.275, 3.676, true],
  [380, 0.059, 0.253, 3.456, true],
  [380, 0.042, 0.25, 4.587],
];

/** One row of a planning table with zero sequence. */
export type PlanningRow = readonly [
  kv: number,
  name: string,
  r1: number,
  x1: number,
  b1: number,
  r0: number,
  x0: number,
  b0: number,
  isSuspect?: true,
];

/**
 * The line table of the Indian planning criteria (T, public digitisation), 50 Hz. In the rows marked suspect R0 is
 * exactly 100 times what its siblings' ratio implies: an exponent slipped in the digitisation.
 */
export const PLANNING_TABLE: readonly PlanningRow[] = [
  [765, 'Quad Bersimis S/C', 0.0114, 0.2856, 4.016, 0.2634, 1.0534, 2.402],
  [765, 'Hexa Zebra D/C', 0.0123, 0.2552, 4.545, 0.2247, 0.9223, 2.756],
  [765, 'Hexa AL59 61/3.08 D/C', 0.012, 0.2546, 4.564, 0.2142, 0.9264, 2.749],
  [400, 'Twin Moose S/C', 0.0298, 0.332, 3.469, 0.1619, 1.24, 2.24],
  [400, 'Twin Moose D/C', 0.0288, 0.3077, 3.763, 0.2675, 1.0738, 2.293],
  [400, 'Twin AL59 61/3.31 D/C', 0.0299, 0.3114, 3.738, 0.249, 1.0843, 2.281],
  [400, 'Twin Lapwing S/C', 0.0197, 0.3056, 3.8, 0.107, 1.1414, 2.454],
  [400, 'Twin Lapwing D/C', 0.0193, 0.3048, 3.8, 0.257, 1.0642, 2.301],
  [400, 'Twin Moose eq AAAC S/C', 0.0309, 0.3304, 3.544, 0.1682, 1.2368, 2.288],
  [400, 'Triple Zebra S/C', 0.0224, 0.2992, 3.662, 12.1856, 1.1118, 2.364, true],
  [400, 'Triple Snowbird D/C', 0.0191, 0.2754, 4.208, 2.3632, 1.0398, 2.469, true],
  [400, 'Quad Zebra S/C', 0.0168, 0.2544, 4.125, 9.1328, 0.9504, 2.684, true],
  [400, 'Quad Bersimis S/C', 0.0119, 0.2496, 4.662, 6.4496, 0.9325, 3.034, true],
  [400, 'Quad Moose S/C', 0.0147, 0.2528, 4.575, 0.248, 1, 2.637],
  [400, 'Quad Moose D/C', 0.0147, 0.2531, 4.581, 0.2491, 0.9994, 2.648],
  [400, 'Quad AL59 D/C', 0.0152, 0.255, 4.562, 0.2302, 1.0109, 2.638],
  [400, 'Quad Moose eq AAAC S/C', 0.0157, 0.2682, 4.369, 8.512, 1.0016, 2.819, true],
  [220, 'Twin Moose S/C', 0.0208, 0.2816, 4.091, 0.2033, 1.1684, 2.287],
  [220, 'Zebra S/C', 0.0697, 0.3978, 2.913, 0.2048, 1.3344, 1.827],
  [220, 'Drake S/C', 0.0871, 0.3978, 2.913, 0.2952, 1.239, 1.663],
  [220, 'Moose S/C', 0.0749, 0.3993, 2.934, 0.22, 1.3392, 1.84],
  [220, 'Zebra D/C', 0.0685, 0.3982, 2.907, 0.2613, 1.2952, 1.832],
  [220, 'Moose D/C', 0.0558, 0.391, 2.961, 0.2486, 1.2879, 1.875],
  [220, 'Twin Zebra D/C', 0.0341, 0.2828, 4.145, 0.2271, 1.1795, 2.339],
  [220, 'Twin Moose D/C', 0.0279, 0.2791, 4.138, 0.2208, 1.1756, 2.31],
  [132, 'Panther D/C', 0.1363, 0.4048, 2.841, 0.341, 1.3253, 1.801],
  [66, 'Dog D/C', 0.2744, 0.4461, 2.851, 0.4805, 1.4397, 1.876],
];

/**
 * Circuits of the transmission owners of Great Britain, 2024, overhead, 5 km and more: percentiles of r, x, b (T data, C
 * percentiles), 50 Hz. The medians stand for a circuit of their voltage.
 */
export const BRITISH_MEDIANS: readonly (readonly [kv: number, r1: number, x1: number, b1: number])[] = [
  [132, 0.1579, 0.394, 2.88],
  [275, 0.0341, 0.314, 3.63],
  [400, 0.0215, 0.306, 3.78],
];

/** Wave speeds, as fractions of light's, of the eight of 714 British circuits that lie outside 0.90 to 1.02 (T+C). */
export const BRITISH_ODDITIES: readonly (readonly [kv: number, speed: number])[] = [
  [132, 0.766],
  [132, 0.765],
  [132, 1.085],
  [132, 1.026],
  [132, 0.547],
  [132, 0.557],
  [400, 1.931],
];

/**
 * IEEE reliability test system, branch 114-116 of the 1996 edition, 230 kV, 27 miles, per unit on 100 MVA (T): X = 0.059
 * is a misprint; the 24-bus original of 1979 has 0.0389. R, B and the length are from memory (M); they give the published
 * speeds, 0.786 and 0.97 of light's.
 */
export const TEST_SYSTEM_BRANCH = {
  kv: 230,
  lengthMiles: 27,
  r: 0.005,
  b: 0.082,
  misprintedX: 0.059,
  originalX: 0.0389,
} as const;
