import type { CauseCode } from '#shared/checks/types';
import type { LineJson, SectionJson, Structure } from './filing-line';
import { KEYS, solve } from './filing-line';
import { CLASSES } from './lines';
import type { Random } from './random';
import { toDigits } from './random';
import {
  file,
  scaled,
  workedOutOn,
  filedAs,
  totals,
  swapped,
  phases,
  onConductors,
  only,
  arithmetic,
  longLine,
  otherConductor,
  position,
  FEET,
  MILE,
  SCOPES,
} from './slip-tools';
import type { Plant } from './slip-tools';

/** A line as filed with one slip in it. */
export interface Planted {
  line: LineJson;
  code: CauseCode;
}

/** How each slip is planted; the scope or kind is drawn where there are several. */
const PLANTS: Readonly<Record<CauseCode, Plant>> = {
  'per-mile': (structure, random) => scaled(random.pick(SCOPES), () => MILE)(structure, random),
  'per-km': (structure, random) => {
    const keys = random.pick(SCOPES);
    const line = file(structure, solve(structure).circuits);
    // The value per kilometre stands in a field that says per mile.
    for (const entry of line.declared)
      for (const key of keys) entry[key].unit = key.startsWith('b') ? 'uS/mi' : 'ohm/mi';
    return line;
  },
  total: (structure, random) => {
    const lengthKm = structure.sections.reduce((sum, section) => sum + section.lengthKm, 0);
    return scaled(random.pick(SCOPES), () => lengthKm)(structure, random);
  },
  'per-length': (structure, random) => {
    const { lengthKm } = solve(structure);
    const keys = random.pick(SCOPES);
    return totals(keys, 'ohm', (entry) => {
      for (const key of keys) entry[key].value = toDigits(entry[key].value / lengthKm, 6);
    })(structure, random);
  },
  'long-line-form': longLine,
  'half-charging': (structure, random) =>
    scaled(random.pick([['b1', 'b0'], ['b1']]), () => 0.5)(structure, random),
  'double-charging': (structure, random) =>
    scaled(random.pick([['b1', 'b0'], ['b1']]), () => 2)(structure, random),
  frequency: (structure, random) => {
    const other = structure.frequencyHz === 60 ? 50 : 60;
    const whole: Plant = () => file(structure, solve(structure, other).circuits);
    return only(random.pick([KEYS, ['x1'], ['x1', 'b1']]), whole)(structure, random);
  },
  capacitance: (structure, random) => {
    const perNanofarad = 2 * Math.PI * structure.frequencyHz * 1e-3;
    const keys = random.pick([['b1', 'b0'], ['b1']] as const);
    return scaled(keys, () => 1 / perNanofarad)(structure, random);
  },
  'base-mva': (structure, random) => {
    const mva = random.pick([1, 10, 50, 200, 500, 1000]);
    return totals(KEYS, 'pu', (entry) => {
      for (const key of KEYS)
        entry[key].value = toDigits(entry[key].value * (key.startsWith('b') ? 100 / mva : mva / 100), 7);
    })(structure, random);
  },
  'base-kv': (structure, random) => {
    const kv = random.pick(
      CLASSES.filter(({ hz, kv: own }) => hz === structure.frequencyHz && own !== structure.nominalVoltageKv),
    ).kv;
    const ratio = (kv / structure.nominalVoltageKv) ** 2;
    return totals(KEYS, 'pu', (entry) => {
      for (const key of KEYS)
        entry[key].value = toDigits(entry[key].value * (key.startsWith('b') ? ratio : 1 / ratio), 7);
    })(structure, random);
  },
  'phase-to-neutral-base': (structure, random) =>
    totals(KEYS, 'pu', (entry) => {
      for (const key of KEYS)
        entry[key].value = toDigits(entry[key].value * (key.startsWith('b') ? 1 / 3 : 3), 7);
    })(structure, random),
  'decimal-shift': (structure, random) => {
    const shift = random.pick([-6, -3, -2, -1, 1, 2, 3, 6]);
    return scaled(random.pick([['r1'], ['x1'], ['b1'], ['r0'], ['x0'], ['b0']] as const), () => 10 ** shift)(
      structure,
      random,
    );
  },
  'r-x-swapped': swapped([['r1', 'x1']]),
  'sequence-swapped': (structure, random) =>
    swapped(
      random.pick([
        [['x1', 'x0']],
        [
          ['r1', 'r0'],
          ['x1', 'x0'],
          ['b1', 'b0'],
        ],
      ] as const),
    )(structure, random),
  'x-b-swapped': swapped([['x1', 'b1']]),
  'dc-resistance': workedOutOn(
    onConductors((conductor) => {
      const {
        dcResistance20OhmPerKm: dc,
        temperatureC = 20,
        temperatureCoefficientPerK: rise = 0.00403,
      } = conductor;
      if (dc !== undefined) conductor.acResistanceOhmPerKm = dc * (1 + rise * (temperatureC - 20));
    }),
  ),
  'resistance-at-20c': workedOutOn(
    onConductors((conductor) => {
      const {
        acResistanceOhmPerKm = 0,
        temperatureC = 20,
        temperatureCoefficientPerK: rise = 0.00403,
      } = conductor;
      if (conductor.model === 'tube') conductor.temperatureC = 20;
      else conductor.acResistanceOhmPerKm = acResistanceOhmPerKm / (1 + rise * (temperatureC - 20));
    }),
  ),
  'radius-for-gmr': workedOutOn(onConductors((conductor) => (conductor.gmrMm = conductor.diameterMm / 2))),
  'diameter-for-radius': workedOutOn(onConductors((conductor) => (conductor.diameterMm *= 2))),
  'gmr-for-radius': workedOutOn(
    onConductors((conductor) => {
      if (conductor.gmrMm !== undefined) conductor.diameterMm = 2 * conductor.gmrMm;
    }),
  ),
  'single-conductor': (structure, random) => {
    if (phases(structure.sections[0] as SectionJson).every(({ bundleCount }) => (bundleCount ?? 1) === 1))
      return null;
    return workedOutOn((section) => {
      for (const spot of phases(section)) {
        delete spot.bundleCount;
        delete spot.bundleSpacingM;
      }
    })(structure, random);
  },
  'bundle-count': (structure, random) => {
    const count = structure.sections[0]?.positions[0]?.bundleCount ?? 1;
    const other = random.pick([2, 3, 4, 6].filter((n) => n !== count));
    return filedAs((section) => {
      for (const spot of phases(section)) spot.bundleCount = other;
      return count > 1;
    })(structure, random);
  },
  'bundle-spacing': (structure, random) => {
    const factor = random.pick([0.5, 2, 1.6, 0.62, 1.35]);
    return filedAs((section) => {
      if (phases(section).every(({ bundleCount }) => (bundleCount ?? 1) === 1)) return false;
      for (const spot of phases(section))
        spot.bundleSpacingM = toDigits((spot.bundleSpacingM ?? 0) * factor, 3);
      return true;
    })(structure, random);
  },
  'arithmetic-spacing': arithmetic,
  'no-ground-wires': (structure, random) => {
    if (structure.sections.every(({ positions }) => positions.every(({ groundWire }) => groundWire !== true)))
      return null;
    return workedOutOn((section) => {
      section.positions = phases(section);
      delete section.conductors['ground'];
    })(structure, random);
  },
  'tower-height': workedOutOn((section) => {
    for (const spot of section.positions) spot.sagM = 0;
  }),
  'earth-resistivity': (structure, random) => {
    const filed = structure.sections[0]?.earthResistivityOhmM;
    const assumed = random.pick([10, 20, 50, 100, 500, 1000, 2000].filter((rho) => rho !== filed));
    return workedOutOn((section) => {
      section.earthResistivityOhmM = assumed;
    })(structure, random);
  },
  'other-conductor': otherConductor,
  'feet-for-metres': (structure, random) => {
    const fields = random.pick([
      ['horizontalM', 'attachmentHeightM', 'sagM'],
      ['attachmentHeightM', 'sagM'],
      ['horizontalM'],
    ] as const);
    return filedAs((section) => {
      for (const spot of section.positions)
        for (const field of fields) spot[field] = toDigits(spot[field] / FEET, 5);
      return true;
    })(structure, random);
  },
  'inches-for-millimetres': filedAs((section) => {
    const conductor = section.conductors['phase'];
    if (conductor === undefined) return false;
    conductor.diameterMm = toDigits(conductor.diameterMm / 25.4, 5);
    if (conductor.gmrMm !== undefined) conductor.gmrMm = toDigits(conductor.gmrMm / 25.4, 5);
    if (conductor.coreDiameterMm !== undefined)
      conductor.coreDiameterMm = toDigits(conductor.coreDiameterMm / 25.4, 5);
    return true;
  }),
  'centimetres-for-metres': filedAs((section) => {
    if (phases(section).every(({ bundleCount }) => (bundleCount ?? 1) === 1)) return false;
    for (const spot of phases(section)) spot.bundleSpacingM = toDigits((spot.bundleSpacingM ?? 0) * 100, 6);
    return true;
  }),
  position: (structure, random) =>
    position(random, random.pick(['sign', 'digits', 'sibling', 'lowest'] as const))(structure, random),
};

/** Plants one slip in a structure; null where the slip has no place in it. */
export function plant(code: CauseCode, structure: Structure, random: Random): Planted | null {
  const line = PLANTS[code](structure, random);
  return line === null ? null : { line, code };
}
