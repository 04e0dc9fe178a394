import { EPSILON_0 } from '#shared/engine/constants';
import type { SequenceConstants } from '#shared/engine/index';
import { handbookData, isChoosable } from '#shared/library/handbook-data';
import { STARTING_LIBRARY } from '#shared/library/conductors';
import type { CauseCode } from '#shared/checks/types';
import { CLASSES } from './lines';
import type { DeclaredJson, Key, LineJson, PositionJson, SectionJson, Structure } from './filing-line';
import { KEYS, declare, solve } from './filing-line';
import type { Random } from './random';
import { toDigits } from './random';

/** A line as filed with one slip in it. */
export interface Planted {
  line: LineJson;
  code: CauseCode;
}

type Plant = (structure: Structure, random: Random) => LineJson | null;

const MILE = 1.609344;
const clone = <T>(value: T): T => structuredClone(value);

/** Scopes that slips of unit are made in. */
const SCOPES: readonly (readonly Key[])[] = [
  KEYS,
  ['r1', 'x1', 'r0', 'x0'],
  ['b1', 'b0'],
  ['x1'],
  ['b1'],
  ['r1'],
  ['x0'],
];

/** A filing of the structure whose declared values are those given, circuit by circuit. */
export function file(structure: Structure, circuits: readonly SequenceConstants[], digits = 6): LineJson {
  const declared = circuits.map((values, index) => {
    const entry = declare(index + 1, values);
    for (const key of KEYS) entry[key].value = toDigits(entry[key].value, digits);
    return entry;
  });
  return { ...clone(structure), declared };
}

function scaled(keys: readonly Key[], factor: (key: Key) => number): Plant {
  return (structure) => {
    const line = file(structure, solve(structure).circuits);
    for (const entry of line.declared) {
      for (const key of keys) entry[key].value = toDigits(entry[key].value * factor(key), 7);
    }
    return line;
  };
}

/** Declares worked-out values of another structure than the one filed. */
function workedOutOn(change: (section: SectionJson) => void): Plant {
  return (structure) => {
    const other = clone(structure);
    other.sections.forEach(change);
    return file(structure, solve(other).circuits);
  };
}

/** Files another structure than the one that the values were worked out on. */
function filedAs(change: (section: SectionJson, random: Random) => boolean, sections = Infinity): Plant {
  return (structure, random) => {
    const filed = clone(structure);
    let isChanged = true;
    for (const section of filed.sections.slice(0, sections)) isChanged = change(section, random) && isChanged;
    return isChanged ? file(filed, solve(structure).circuits) : null;
  };
}

const totals =
  (
    keys: readonly Key[],
    form: 'ohm' | 'pu',
    change: (entry: DeclaredJson, structure: Structure, random: Random) => void,
  ): Plant =>
  (structure, random) => {
    const { circuits, lengthKm } = solve(structure);
    const line = file(structure, circuits);
    const zBase = structure.nominalVoltageKv ** 2 / 100;
    for (const entry of line.declared) {
      for (const key of keys) {
        const isShunt = key.startsWith('b');
        const total = entry[key].value * lengthKm;
        const value = form === 'ohm' ? total : isShunt ? total * 1e-6 * zBase : total / zBase;
        entry[key] = { value: toDigits(value, 6), unit: form === 'ohm' ? (isShunt ? 'uS' : 'ohm') : 'pu' };
      }
      change(entry, structure, random);
    }
    return line;
  };

const swap = (entry: DeclaredJson, one: Key, other: Key): void => {
  [entry[one].value, entry[other].value] = [entry[other].value, entry[one].value];
};

const swapped =
  (pairs: readonly (readonly [Key, Key])[]): Plant =>
  (structure) => {
    const line = file(structure, solve(structure).circuits);
    for (const entry of line.declared) for (const [one, other] of pairs) swap(entry, one, other);
    return line;
  };

const phases = (section: SectionJson): PositionJson[] =>
  section.positions.filter(({ phase }) => phase !== undefined);

const onConductors =
  (change: (conductor: SectionJson['conductors'][string]) => void) =>
  (section: SectionJson): void => {
    const conductor = section.conductors['phase'];
    if (conductor !== undefined) change(conductor);
  };

/** Only the constants named are declared with the slip; the rest are honest. */
function only(keys: readonly Key[], plant: Plant): Plant {
  return (structure, random) => {
    const slipped = plant(structure, random);
    if (slipped === null) return null;
    const honest = file(structure, solve(structure).circuits);
    slipped.declared.forEach((entry, index) => {
      const fair = honest.declared[index];
      if (fair === undefined) return;
      for (const key of KEYS) if (!keys.includes(key)) entry[key] = fair[key];
    });
    return slipped;
  };
}

const arithmetic: Plant = (structure) => {
  const { circuits } = solve(structure);
  const section = structure.sections[0];
  if (section === undefined) return null;
  const omega = 2 * Math.PI * structure.frequencyHz;
  const charge = omega * 2 * Math.PI * EPSILON_0 * 1e9;
  const slipped = circuits.map((values, index) => {
    const [a, b, c] = phases(section).filter(({ circuit }) => circuit === index + 1);
    if (a === undefined || b === undefined || c === undefined) return values;
    const between = (one: PositionJson, two: PositionJson): number =>
      Math.hypot(one.horizontalM - two.horizontalM, one.attachmentHeightM - two.attachmentHeightM);
    const distances = [between(a, b), between(b, c), between(a, c)];
    const mean = distances.reduce((sum, distance) => sum + distance, 0) / 3;
    const shift = Math.log(mean / Math.cbrt(distances.reduce((product, distance) => product * distance, 1)));
    return { ...values, x1: values.x1 + omega * 2e-4 * shift, b1: charge / (charge / values.b1 + shift) };
  });
  return file(structure, slipped);
};

const longLine: Plant = (structure) => {
  const long = clone(structure);
  for (const section of long.sections) section.lengthKm = 380;
  const { circuits, equivalent, lengthKm } = solve(long);
  return file(
    long,
    circuits.map((values, index) => {
      const pi = equivalent[index];
      if (pi === undefined) return values;
      const { r, x, b, r0, x0, b0 } = pi;
      return {
        r1: r / lengthKm,
        x1: x / lengthKm,
        b1: b / lengthKm,
        r0: r0 / lengthKm,
        x0: x0 / lengthKm,
        b0: b0 / lengthKm,
      };
    }),
  );
};

const otherConductor: Plant = (structure, random) => {
  const used = structure.sections[0]?.conductors['phase'];
  const rows = STARTING_LIBRARY.conductors.filter(
    (row) =>
      isChoosable(row) &&
      !/shield/i.test(row.family) &&
      Math.abs(row.diameterMm / (used?.diameterMm ?? 1) - 1) < 0.4 &&
      row.name !== used?.name,
  );
  const data = handbookData(random.pick(rows), used?.temperatureC ?? 50);
  if (data === null) return null;
  return workedOutOn((section) => (section.conductors['phase'] = { ...data }))(structure, random);
};

const FEET = 0.3048;

const position = (random: Random, kind: 'sign' | 'digits' | 'sibling' | 'lowest'): Plant =>
  filedAs((section) => {
    const own = phases(section);
    const spot = random.pick(own);
    const others = own.filter((other) => other !== spot);
    if (kind === 'sign') spot.horizontalM = -spot.horizontalM;
    if (kind === 'digits') {
      const field = random.pick(['horizontalM', 'attachmentHeightM'] as const);
      const digits = String(Math.abs(spot[field])).replace('.', '').slice(0, 2);
      if (digits.length < 2 || digits[0] === digits[1]) return false;
      const text = String(Math.abs(spot[field]));
      const at = text.split('').flatMap((sign, index) => (sign === '.' ? [] : [index]));
      const signs = text.split('');
      const [one = 0, two = 1] = at;
      [signs[one], signs[two]] = [signs[two] ?? '', signs[one] ?? ''];
      spot[field] = Math.sign(spot[field]) * Number(signs.join(''));
    }
    if (kind === 'sibling') {
      const field = random.pick(['horizontalM', 'attachmentHeightM'] as const);
      spot[field] = random.pick(others)[field];
    }
    if (kind === 'lowest') {
      const lowest = Math.min(...section.positions.map(({ attachmentHeightM }) => attachmentHeightM));
      if (spot.attachmentHeightM - lowest < spot.sagM + 1) return false;
      spot.attachmentHeightM = Number((spot.attachmentHeightM - lowest).toFixed(2));
    }
    return !own.some((one) =>
      own.some(
        (two) =>
          one !== two &&
          Math.hypot(one.horizontalM - two.horizontalM, one.attachmentHeightM - two.attachmentHeightM) < 1.2,
      ),
    );
  }, 1);

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
