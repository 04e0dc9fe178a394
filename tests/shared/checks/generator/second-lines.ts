import type {
  ConductorJson,
  Key,
  LineJson,
  PositionJson,
  QuantityJson,
  SectionJson,
  Structure,
} from './filing-line';
import { KEYS } from './filing-line';
import type { Random } from './random';
import { toDigits, toPlaces } from './random';
import type { Planted } from './slips';

/**
 * A second generator, unlike the first on purpose: voltages between the classes, lopsided structures, every phase with
 * a sag of its own, conductors that stand in no library, tubes, up to three ground wires, several sections, declared
 * values in whatever unit and rounding.
 */
const VOLTAGES: readonly (readonly [kv: number, hz: 50 | 60, spacingM: number, bundle: readonly number[]])[] =
  [
    [66, 60, 2.6, [1]],
    [120, 60, 3.7, [1]],
    [138, 60, 4.6, [1]],
    [225, 50, 6.1, [1, 2]],
    [230, 60, 6.4, [1, 2]],
    [287, 50, 7.2, [2]],
    [315, 60, 7.8, [2]],
    [380, 50, 8.4, [2, 3, 4]],
    [420, 50, 9.3, [3, 4]],
    [525, 60, 10.6, [3, 4]],
    [115, 50, 3.9, [1]],
    [154, 60, 5.1, [1]],
  ];

export function secondLine(random: Random, ordinal: number): Structure {
  const [kv, hz, spacingM, bundles] = random.pick(VOLTAGES);
  const sections = random.pick([1, 1, 1, 2, 3]);
  const isDouble = random.chance(0.35);
  const bundleCount = random.pick(bundles);
  const phase = conductor(random, bundleCount > 1 ? [22, 33] : [15, 30]);
  const ground = shield(random);
  return {
    name: `Feeder ${ordinal}`,
    from: 'Carrow',
    to: 'Dunmore',
    nominalVoltageKv: kv,
    frequencyHz: hz,
    sections: Array.from({ length: sections }, () =>
      section(random, spacingM, kv, bundleCount, phase, ground, isDouble),
    ),
  };
}

function conductor(random: Random, [thin, thick]: readonly [number, number]): ConductorJson {
  const diameterMm = toPlaces(random.between(thin, thick), 2);
  const coreDiameterMm = toPlaces(diameterMm * random.between(0.25, 0.42), 2);
  const dc = toPlaces(random.between(37, 46) / (diameterMm / 2) ** 2 / Math.PI, 5);
  const temperatureC = random.pick([40, 60, 75, 80]);
  if (random.chance(0.25)) {
    return { model: 'tube', diameterMm, coreDiameterMm, dcResistance20OhmPerKm: dc, temperatureC };
  }
  return {
    name: 'As built',
    model: 'handbook',
    diameterMm,
    gmrMm: toPlaces((diameterMm / 2) * random.between(0.775, 0.83), 3),
    acResistanceOhmPerKm: toPlaces(dc * (1 + 0.00403 * (temperatureC - 20)) * random.between(1.01, 1.05), 5),
    ...(random.chance(0.7) ? { dcResistance20OhmPerKm: dc } : {}),
    temperatureC,
  };
}

function shield(random: Random): ConductorJson {
  const diameterMm = toPlaces(random.between(9, 17), 2);
  const isSteel = random.chance(0.5);
  return {
    model: 'handbook',
    diameterMm,
    gmrMm: toPlaces(isSteel ? random.between(0.05, 1.5) : diameterMm * 0.38, 3),
    acResistanceOhmPerKm: toPlaces(isSteel ? random.between(2.5, 5) : random.between(0.25, 1.3), 3),
  };
}

function section(
  random: Random,
  spacingM: number,
  kv: number,
  bundleCount: number,
  phase: ConductorJson,
  ground: ConductorJson,
  isDouble: boolean,
): SectionJson {
  const lowM = 9 + kv / 55 + random.between(5, 9);
  const bundle =
    bundleCount === 1 ? {} : { bundleCount, bundleSpacingM: toPlaces(random.between(0.3, 0.5), 3) };
  const spots = isDouble
    ? [...tree(random, 1, spacingM, lowM), ...tree(random, 2, spacingM, lowM)]
    : single(random, spacingM, lowM);
  const topM = Math.max(...spots.map(({ attachmentHeightM }) => attachmentHeightM));
  const wires = random.pick([0, 1, 1, 2, 2, 3]);
  return {
    kind: 'overhead',
    lengthKm: toPlaces(random.between(4, 90), 2),
    earthResistivityOhmM: toDigits(10 ** random.between(1.2, 3.3), 3),
    groundWireBonding: random.chance(0.75) ? 'continuous' : 'segmented',
    conductors: { phase: { ...phase }, ...(wires > 0 ? { ground: { ...ground } } : {}) },
    positions: [
      ...spots.map((spot): PositionJson => ({
        ...spot,
        conductor: 'phase',
        sagM: toPlaces(random.between(4.5, 8.5), 2),
        ...bundle,
      })),
      ...Array.from({ length: wires }, (_, at): PositionJson => ({
        groundWire: true,
        conductor: 'ground',
        horizontalM: toPlaces((at - (wires - 1) / 2) * spacingM * random.between(0.9, 1.3), 2),
        attachmentHeightM: toPlaces(topM + random.between(2.5, 6), 2),
        sagM: toPlaces(random.between(3, 6.5), 2),
      })),
    ],
  };
}

type Spot = Pick<PositionJson, 'circuit' | 'phase' | 'horizontalM' | 'attachmentHeightM'>;

function single(random: Random, spacingM: number, lowM: number): Spot[] {
  const lean = random.between(-1.5, 1.5);
  const style = random.pick(['level', 'triangle', 'stagger'] as const);
  const spots = {
    level: [
      [-1, 0],
      [0, 0.05],
      [1, 0],
    ],
    triangle: [
      [-0.55, 0],
      [0.05, 0.8],
      [0.6, 0.15],
    ],
    stagger: [
      [-0.5, 0],
      [0.5, 0.62],
      [-0.6, 1.25],
    ],
  } as const;
  return (['a', 'b', 'c'] as const).map((phase, at) => {
    const [across = 0, up = 0] = spots[style][at] ?? [];
    const acrossM = across * spacingM * random.between(0.95, 1.1);
    const upM = up * spacingM + random.between(0, 0.6);
    return {
      circuit: 1,
      phase,
      horizontalM: toPlaces(acrossM + lean, 2),
      attachmentHeightM: toPlaces(lowM + upM, 2),
    };
  });
}

function tree(random: Random, circuit: number, spacingM: number, lowM: number): Spot[] {
  const side = circuit === 1 ? -1 : 1;
  const phases = random.pick([
    ['a', 'b', 'c'],
    ['b', 'c', 'a'],
    ['c', 'a', 'b'],
  ] as const);
  return phases.map((phase, at) => ({
    circuit,
    phase,
    horizontalM: toPlaces(side * spacingM * ([0.6, 0.95, 0.72][at] ?? 0.7) * random.between(0.95, 1.05), 2),
    attachmentHeightM: toPlaces(lowM + (2 - at) * spacingM * random.between(0.92, 1.06), 2),
  }));
}

/** Slips whose unit is what is wrong with them: their values keep the unit that they were planted in. */
const UNIT_SLIPS = new Set([
  'per-mile',
  'per-km',
  'total',
  'per-length',
  'capacitance',
  'base-mva',
  'base-kv',
  'phase-to-neutral-base',
  'r-x-swapped',
  'sequence-swapped',
  'x-b-swapped',
  'long-line-form',
]);

/** Writes the declared values as another applicant would: other units, fewer digits. */
export function inOtherUnits(planted: Planted, random: Random): Planted {
  const { line, code } = planted;
  const digits = random.pick([4, 5]);
  const series = random.pick(['ohm/km', 'ohm/mi', 'ohm', 'pu', '%']);
  const shunt = random.pick(['uS/km', 'uS/mi', 'nF/km', 'uS', 'pu', 'Mvar']);
  for (const entry of line.declared) {
    for (const key of KEYS) {
      const unit = UNIT_SLIPS.has(code) ? entry[key].unit : key.startsWith('b') ? shunt : series;
      entry[key] = convert(entry[key], unit, line, key);
      entry[key].value = toDigits(entry[key].value, digits);
    }
  }
  return planted;
}

function convert(quantity: QuantityJson, unit: string, line: LineJson, key: Key): QuantityJson {
  if (quantity.unit === unit) return { ...quantity };
  const lengthKm = line.sections.reduce((sum, { lengthKm: own }) => sum + own, 0);
  const zBase = line.nominalVoltageKv ** 2 / 100;
  const perKm = quantity.value;
  const total = perKm * lengthKm;
  const isShunt = key.startsWith('b');
  const values: Record<string, number> = {
    'ohm/mi': perKm * 1.609344,
    'uS/mi': perKm * 1.609344,
    ohm: total,
    uS: total,
    'nF/km': perKm / (2 * Math.PI * line.frequencyHz * 1e-3),
    Mvar: total * 1e-6 * line.nominalVoltageKv ** 2,
    pu: isShunt ? total * 1e-6 * zBase : total / zBase,
    '%': (total / zBase) * 100,
  };
  return { value: values[unit] ?? perKm, unit: values[unit] === undefined ? quantity.unit : unit };
}
