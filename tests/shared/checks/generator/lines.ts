import { DEFAULT_BANDS } from '#shared/checks/defaults/rule-set';
import { handbookData, isChoosable } from '#shared/library/handbook-data';
import { STARTING_LIBRARY } from '#shared/library/conductors';
import type { PositionJson, SectionJson, Structure } from './filing-line';
import type { Random } from './random';
import { toPlaces } from './random';

/** Voltage classes with how their lines are usually built: spacing, subconductors, thickness of conductor. */
interface Build {
  kv: number;
  hz: 50 | 60;
  spacingM: readonly [number, number];
  bundles: readonly number[];
  diameterMm: readonly [number, number];
}

const BUILDS: readonly Build[] = [
  { kv: 69, hz: 60, spacingM: [2.2, 3.4], bundles: [1], diameterMm: [14, 25] },
  { kv: 115, hz: 60, spacingM: [3, 4.4], bundles: [1], diameterMm: [17, 29] },
  { kv: 138, hz: 60, spacingM: [3.4, 5.2], bundles: [1], diameterMm: [19, 31] },
  { kv: 161, hz: 60, spacingM: [4, 5.8], bundles: [1], diameterMm: [21, 33] },
  { kv: 230, hz: 60, spacingM: [5, 7.2], bundles: [1, 2], diameterMm: [25, 36] },
  { kv: 345, hz: 60, spacingM: [7, 9.4], bundles: [2], diameterMm: [25, 36] },
  { kv: 500, hz: 60, spacingM: [9.2, 12], bundles: [3, 4], diameterMm: [25, 36] },
  { kv: 765, hz: 60, spacingM: [12.5, 15], bundles: [4, 6], diameterMm: [28, 37] },
  { kv: 110, hz: 50, spacingM: [3, 4.6], bundles: [1], diameterMm: [17, 30] },
  { kv: 132, hz: 50, spacingM: [3.4, 5], bundles: [1], diameterMm: [19, 30] },
  { kv: 150, hz: 50, spacingM: [3.8, 5.4], bundles: [1], diameterMm: [20, 32] },
  { kv: 220, hz: 50, spacingM: [5, 7], bundles: [1, 2], diameterMm: [24, 33] },
  { kv: 275, hz: 50, spacingM: [6, 8], bundles: [2], diameterMm: [24, 33] },
  { kv: 400, hz: 50, spacingM: [7.5, 10], bundles: [2, 3, 4], diameterMm: [24, 34] },
];

const SIDES_M = [0.35, 0.4, 0.45, 0.4572] as const;

const SHIELDS = STARTING_LIBRARY.conductors
  .filter(({ family }) => /shield/i.test(family))
  .filter(isChoosable);

/** A random line of a random class, and every figure of it as an applicant would write it down. */
export function randomLine(random: Random, ordinal: number): Structure {
  const build = random.pick(BUILDS);
  const isDouble = random.chance(0.3);
  return {
    name: `Line ${ordinal}`,
    from: 'Ansley',
    to: 'Borrow',
    nominalVoltageKv: build.kv,
    frequencyHz: build.hz,
    sections: [randomSection(random, build, isDouble)],
  };
}

/** All voltage classes that lines are drawn from. */
export const CLASSES = BUILDS.map(({ kv, hz }) => ({ kv, hz }));

/** Classes of the default bands, for a check that the generator leaves none out. */
export const BAND_CLASSES = [
  ...new Set(DEFAULT_BANDS.map(({ classKv, frequencyHz }) => `${classKv}/${frequencyHz}`)),
];

function randomSection(random: Random, build: Build, isDouble: boolean): SectionJson {
  const [thin, thick] = build.diameterMm;
  const rows = STARTING_LIBRARY.conductors.filter(
    (row) =>
      isChoosable(row) && row.diameterMm >= thin && row.diameterMm <= thick && !/shield/i.test(row.family),
  );
  const phase = handbookData(random.pick(rows), random.pick([25, 50, 75]));
  const ground = handbookData(random.pick(SHIELDS), 50);
  if (phase === null || ground === null) throw new Error('a conductor that cannot be chosen was chosen');
  const bundleCount = random.pick(build.bundles);
  const spacingM = toPlaces(random.between(...build.spacingM), 2);
  const sagM = toPlaces(random.between(5, 10), 1);
  const lowestM = toPlaces(8 + build.kv / 60 + sagM + random.between(0, 5), 1);
  const bundle = bundleCount === 1 ? {} : { bundleCount, bundleSpacingM: random.pick(SIDES_M) };
  const phases = isDouble
    ? [...arms(random, 1, -1, spacingM, lowestM), ...arms(random, 2, 1, spacingM, lowestM)]
    : random.pick([flat, delta, vertical])(random, spacingM, lowestM);
  const topM = Math.max(...phases.map(({ attachmentHeightM }) => attachmentHeightM));
  const wires = random.pick([0, 1, 2, 2]);
  const wireAt = wires === 1 ? [0] : [-toPlaces(spacingM * 0.7, 2), toPlaces(spacingM * 0.7, 2)];
  return {
    kind: 'overhead',
    lengthKm: toPlaces(random.between(8, 160), 1),
    earthResistivityOhmM: random.pick([30, 50, 100, 100, 200, 300, 500, 1000]),
    groundWireBonding: random.chance(0.85) ? 'continuous' : 'segmented',
    conductors: { phase, ...(wires === 0 ? {} : { ground }) },
    positions: [
      ...phases.map((position) => ({ ...position, conductor: 'phase', sagM, ...bundle })),
      ...wireAt.slice(0, wires).map((horizontalM): PositionJson => ({
        groundWire: true,
        conductor: 'ground',
        horizontalM,
        attachmentHeightM: toPlaces(topM + 0.6 * spacingM + 1, 1),
        sagM: toPlaces(sagM * 0.8, 1),
      })),
    ],
  };
}

type Spot = Pick<PositionJson, 'horizontalM' | 'attachmentHeightM'> & {
  circuit: number;
  phase: 'a' | 'b' | 'c';
};

const PHASES = ['a', 'b', 'c'] as const;

function flat(_random: Random, spacingM: number, lowestM: number): Spot[] {
  return PHASES.map((phase, at) => ({
    circuit: 1,
    phase,
    horizontalM: toPlaces((at - 1) * spacingM, 2),
    attachmentHeightM: lowestM,
  }));
}

function delta(random: Random, spacingM: number, lowestM: number): Spot[] {
  const upM = toPlaces(spacingM * random.between(0.6, 1), 1);
  return PHASES.map((phase, at) => ({
    circuit: 1,
    phase,
    horizontalM: toPlaces((at - 1) * spacingM * 0.75, 2),
    attachmentHeightM: toPlaces(lowestM + (at === 1 ? upM : 0), 1),
  }));
}

function vertical(_random: Random, spacingM: number, lowestM: number): Spot[] {
  return PHASES.map((phase, at) => ({
    circuit: 1,
    phase,
    horizontalM: [2.4, 3.1, 2.6][at] ?? 2.4,
    attachmentHeightM: toPlaces(lowestM + (2 - at) * spacingM, 1),
  }));
}

function arms(random: Random, circuit: number, side: number, spacingM: number, lowestM: number): Spot[] {
  const order = random.pick([PHASES, ['c', 'b', 'a'] as const]);
  return order.map((phase, at) => ({
    circuit,
    phase,
    horizontalM: toPlaces(side * spacingM * ([0.65, 0.85, 0.7][at] ?? 0.7), 2),
    attachmentHeightM: toPlaces(lowestM + (2 - at) * spacingM * 0.95, 1),
  }));
}
