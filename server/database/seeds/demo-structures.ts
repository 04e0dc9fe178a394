/** Structures of the demo's lines: invented, with the dimensions that such lines usually have. */
export type StructureName =
  | 'flat345'
  | 'single345'
  | 'flat500'
  | 'frame230'
  | 'light230'
  | 'delta138'
  | 'pole115'
  | 'double230'
  | 'double345';

export interface Structure {
  kv: number;
  conductor: string;
  temperatureC: number;
  groundWire: string;
  bundleCount: number;
  bundleSpacingM: number;
  sagM: number;
  groundWireSagM: number;
  /** [circuit, phase, horizontal offset in m, attachment height in m] */
  phases: readonly (readonly [number, 'a' | 'b' | 'c', number, number])[];
  /** [horizontal offset in m, attachment height in m] */
  groundWires: readonly (readonly [number, number])[];
  ratingA: number;
}

const STEEL = '3/8 in EHS 7-strand steel';
const ALUMOWELD = '7 No.8 Alumoweld';

const FLAT_345: Structure = {
  kv: 345,
  conductor: 'Drake',
  temperatureC: 50,
  groundWire: STEEL,
  bundleCount: 2,
  bundleSpacingM: 0.4572,
  sagM: 9,
  groundWireSagM: 6.5,
  phases: [
    [1, 'a', -9, 24],
    [1, 'b', 0, 24],
    [1, 'c', 9, 24],
  ],
  groundWires: [
    [-6.5, 30],
    [6.5, 30],
  ],
  ratingA: 1800,
};

const FRAME_230: Structure = {
  kv: 230,
  conductor: 'Cardinal',
  temperatureC: 50,
  groundWire: STEEL,
  bundleCount: 1,
  bundleSpacingM: 0,
  sagM: 7,
  groundWireSagM: 5,
  phases: [
    [1, 'a', -6, 19],
    [1, 'b', 0, 19],
    [1, 'c', 6, 19],
  ],
  groundWires: [
    [-3.5, 24],
    [3.5, 24],
  ],
  ratingA: 980,
};

export const STRUCTURES: Readonly<Record<StructureName, Structure>> = {
  flat345: FLAT_345,
  // one conductor a phase is rare at this voltage: the bands ask why
  single345: { ...FLAT_345, conductor: 'Cardinal', bundleCount: 1, bundleSpacingM: 0, ratingA: 990 },
  frame230: FRAME_230,
  // a light conductor, whose resistance the bands ask about
  light230: { ...FRAME_230, conductor: 'Hawk', ratingA: 640 },
  flat500: {
    kv: 500,
    conductor: 'Cardinal',
    temperatureC: 50,
    groundWire: ALUMOWELD,
    bundleCount: 3,
    bundleSpacingM: 0.4572,
    sagM: 10,
    groundWireSagM: 7.5,
    phases: [
      [1, 'a', -10.5, 28],
      [1, 'b', 0, 28],
      [1, 'c', 10.5, 28],
    ],
    groundWires: [
      [-8, 37],
      [8, 37],
    ],
    ratingA: 3000,
  },
  delta138: {
    kv: 138,
    conductor: 'Hawk',
    temperatureC: 50,
    groundWire: STEEL,
    bundleCount: 1,
    bundleSpacingM: 0,
    sagM: 5,
    groundWireSagM: 3.8,
    phases: [
      [1, 'a', -3, 16],
      [1, 'b', 3, 18],
      [1, 'c', 3, 14],
    ],
    groundWires: [[0, 22]],
    ratingA: 650,
  },
  pole115: {
    kv: 115,
    conductor: 'Linnet',
    temperatureC: 50,
    groundWire: STEEL,
    bundleCount: 1,
    bundleSpacingM: 0,
    sagM: 4.5,
    groundWireSagM: 3.4,
    phases: [
      [1, 'a', -2.4, 15],
      [1, 'b', 2.4, 16.4],
      [1, 'c', -2.4, 17.8],
    ],
    groundWires: [[0, 21]],
    ratingA: 520,
  },
  double230: {
    kv: 230,
    conductor: 'Drake',
    temperatureC: 50,
    groundWire: ALUMOWELD,
    bundleCount: 1,
    bundleSpacingM: 0,
    sagM: 8,
    groundWireSagM: 6,
    phases: [
      [1, 'a', -5, 34],
      [1, 'b', -5.6, 28],
      [1, 'c', -5, 22],
      [2, 'a', 5, 22],
      [2, 'b', 5.6, 28],
      [2, 'c', 5, 34],
    ],
    groundWires: [
      [-3.5, 40],
      [3.5, 40],
    ],
    ratingA: 900,
  },
  double345: {
    kv: 345,
    conductor: 'Cardinal',
    temperatureC: 50,
    groundWire: ALUMOWELD,
    bundleCount: 2,
    bundleSpacingM: 0.4572,
    sagM: 9,
    groundWireSagM: 6.8,
    phases: [
      [1, 'a', -7, 40],
      [1, 'b', -7.8, 32],
      [1, 'c', -7, 24],
      [2, 'a', 7, 24],
      [2, 'b', 7.8, 32],
      [2, 'c', 7, 40],
    ],
    groundWires: [
      [-5.5, 48],
      [5.5, 48],
    ],
    ratingA: 2000,
  },
};
