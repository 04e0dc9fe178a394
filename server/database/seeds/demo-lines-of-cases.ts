import type { LineSpec, Slip } from './demo-lines';
import type { StructureName } from './demo-structures';

const line = (
  structure: StructureName,
  from: string,
  to: string,
  lengthKm: number,
  slip: Slip = 'honest',
): LineSpec => ({ structure, from, to, lengthKm, slip });

/** The lines of each application: about forty, most of them honest. */
export const LINES = {
  fellgateWind: () => [
    line('flat345', 'Fellgate', 'Sarn', 41.6, 'x1-per-mile'),
    line('single345', 'Sarn', 'Tarn Moss', 63.2),
    line('frame230', 'Harrow Fell', 'Sarn', 28.4),
    line('frame230', 'Harrow Fell', 'Fellgate', 17.9, 'half-charging'),
    line('flat345', 'Sarn East', 'Sarn West', 2.8),
  ],
  fellgateStorage: () => [
    line('double230', 'Fellgate', 'Skell Edge', 23.7, 'x1-total'),
    line('pole115', 'Skell Edge', 'Ullscar Foot', 11.2),
  ],
  harrowfellSolar: () => [line('frame230', 'Harrowfell Solar', 'Harrow Fell', 9.6)],
  skerrowWind: () => [
    line('double345', 'Skerrow', 'Lang Knott', 52.3),
    line('flat345', 'Lang Knott', 'Sarn', 38.7, 'single-conductor'),
    line('flat345', 'Skerrow', 'Skerrow North', 14.1),
    line('delta138', 'Skerrow', 'Dunmere', 22.8),
    line('delta138', 'Dunmere', 'Kestrow', 18.4, 'half-charging'),
    line('delta138', 'Kestrow', 'Pellow Head', 27.5),
    line('light230', 'Lang Knott', 'Aldbeck', 33.9),
    line('frame230', 'Aldbeck', 'Harrow Fell', 44.2, 'position'),
  ],
  tarnMossWind: () => [
    line('flat500', 'Tarn Moss', 'Lang Knott', 88.4),
    line('flat500', 'Tarn Moss', 'Sarn', 71.0, 'single-conductor'),
    line('flat345', 'Tarn Moss', 'Harrow Fell', 36.5),
    line('double345', 'Tarn Moss', 'Skell Edge', 29.3),
    line('frame230', 'Tarn Moss', 'Ullscar Foot', 19.7, 'other-frequency'),
    line('delta138', 'Tarn Moss', 'Dunmere', 16.2),
  ],
  skellEdgeSupply: () => [
    line('delta138', 'Skell Edge', 'Cairnside', 13.3, 'half-charging'),
    line('delta138', 'Cairnside', 'Dunmere', 21.7),
    line('pole115', 'Cairnside', 'Aldbeck', 8.9),
  ],
  pellowTidal: () => [
    line('light230', 'Pellow Head', 'Kestrow', 31.1),
    line('pole115', 'Pellow Head', 'Pellow Quay', 6.4),
  ],
  wexmoorSolar: () => [
    line('delta138', 'Wexmoor', 'Tarn Moss', 19.8, 'other-frequency'),
    line('delta138', 'Wexmoor', 'Wexmoor South', 7.3),
  ],
  lintgarthHydrogen: () => [
    line('frame230', 'Lintgarth', 'Harrow Fell', 26.4, 'all-per-mile'),
    line('frame230', 'Lintgarth', 'Skell Edge', 34.8, 'position'),
    line('double230', 'Lintgarth', 'Lintgarth Quay', 8.2),
  ],
  aldbeckQuarry: () => [
    line('delta138', 'Aldbeck', 'Aldbeck Quarry', 12.6, 'no-geometry'),
    line('pole115', 'Aldbeck Quarry', 'Quarry Works', 4.1, 'x1-per-mile'),
  ],
  dunmereStorage: () => [
    line('delta138', 'Dunmere', 'Dunmere Storage', 15.5, 'x1-per-mile'),
    line('delta138', 'Dunmere Storage', 'Kestrow', 23.6),
  ],
  cairnsideRail: () => [line('delta138', 'Cairnside', 'Cairnside Rail', 10.4)],
  ullscarHydro: () => [
    line('frame230', 'Ullscar Foot', 'Ullscar Dam', 14.2, 'cable'),
    line('pole115', 'Ullscar Foot', 'Ullscar Works', 5.7),
  ],
} satisfies Record<string, () => LineSpec[]>;
