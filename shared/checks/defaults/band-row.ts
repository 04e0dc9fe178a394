import type { BandParameter } from '../parameters';

/** Where a default bound comes from: the published data set or the computation behind it. */
export const BAND_SOURCES = {
  synthetic:
    'synthetic North American test grids (200 to 10 000 buses), 5th to 95th percentile; line lengths inferred',
  britain:
    'published circuit data of the transmission owners of Great Britain, 2024, overhead circuits of 5 km and more, 2.5th to 97.5th percentile',
  ieeeCases: 'IEEE 39-, 118- and 300-bus cases, 5th to 95th percentile; line lengths inferred',
  india: 'line table of the Indian planning criteria (public digitisation)',
  kundur: 'Kundur, Power System Stability and Control, table 6.1 (from memory)',
  poland: 'Polish 110, 220 and 400 kV cases, 5th to 95th percentile; line lengths inferred',
  france: 'French 63 to 380 kV cases, cables left out, 5th to 95th percentile; line lengths inferred',
  rts: 'IEEE reliability test system of 1996, branch table with lengths',
  benchmarkGrids: 'open benchmark grids at 110, 220 and 380 kV, one line type a level',
  sweep:
    'computed: sweep of flat lines over conductors, spacings, heights, ground wires and earths, with Carson’s earth return',
  lineTypes: 'open table of standard line types at 110, 220 and 380 kV, 50 Hz',
} as const;

/** A key of `BAND_SOURCES`. */
export type BandSource = keyof typeof BAND_SOURCES;

/** The source of every outer bound. */
export const OUTER_SOURCE = 'judgement: a margin around the typical range';

/** Class kV, parameter, typical low and high, outer low and high, sources of the two typical bounds. */
export type BandRow = readonly [
  number,
  BandParameter,
  number,
  number,
  number,
  number,
  BandSource,
  BandSource,
];
