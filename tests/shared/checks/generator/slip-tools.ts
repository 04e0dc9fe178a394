import { EPSILON_0 } from '#shared/engine/constants';
import type { SequenceConstants } from '#shared/engine/index';
import { handbookData, isChoosable } from '#shared/library/handbook-data';
import { STARTING_LIBRARY } from '#shared/library/conductors';
import type { DeclaredJson, Key, LineJson, PositionJson, SectionJson, Structure } from './filing-line';
import { KEYS, declare, solve } from './filing-line';
import type { Random } from './random';
import { toDigits } from './random';

/** Makes a filing with one slip of a structure; null where the slip has no place in it. */
export type Plant = (structure: Structure, random: Random) => LineJson | null;

export const MILE = 1.609344;
export const clone = <T>(value: T): T => structuredClone(value);

/** Scopes that slips of unit are made in. */
export const SCOPES: readonly (readonly Key[])[] = [
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

export function scaled(keys: readonly Key[], factor: (key: Key) => number): Plant {
  return (structure) => {
    const line = file(structure, solve(structure).circuits);
    for (const entry of line.declared) {
      for (const key of keys) entry[key].value = toDigits(entry[key].value * factor(key), 7);
    }
    return line;
  };
}

/** Declares worked-out values of another structure than the one filed. */
export function workedOutOn(change: (section: SectionJson) => void): Plant {
  return (structure) => {
    const other = clone(structure);
    other.sections.forEach(change);
    return file(structure, solve(other).circuits);
  };
}

/** Files another structure than the one that the values were worked out on. */
export function filedAs(
  change: (section: SectionJson, random: Random) => boolean,
  sections = Infinity,
): Plant {
  return (structure, random) => {
    const filed = clone(structure);
    let isChanged = true;
    for (const section of filed.sections.slice(0, sections)) isChanged = change(section, random) && isChanged;
    return isChanged ? file(filed, solve(structure).circuits) : null;
  };
}

export const totals =
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

export const swap = (entry: DeclaredJson, one: Key, other: Key): void => {
  [entry[one].value, entry[other].value] = [entry[other].value, entry[one].value];
};

export const swapped =
  (pairs: readonly (readonly [Key, Key])[]): Plant =>
  (structure) => {
    const line = file(structure, solve(structure).circuits);
    for (const entry of line.declared) for (const [one, other] of pairs) swap(entry, one, other);
    return line;
  };

export const phases = (section: SectionJson): PositionJson[] =>
  section.positions.filter(({ phase }) => phase !== undefined);

export const onConductors =
  (change: (conductor: SectionJson['conductors'][string]) => void) =>
  (section: SectionJson): void => {
    const conductor = section.conductors['phase'];
    if (conductor !== undefined) change(conductor);
  };

/** Only the constants named are declared with the slip; the rest are honest. */
export function only(keys: readonly Key[], plant: Plant): Plant {
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

export const arithmetic: Plant = (structure) => {
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

export const longLine: Plant = (structure) => {
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

export const otherConductor: Plant = (structure, random) => {
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

export const FEET = 0.3048;

export const position = (random: Random, kind: 'sign' | 'digits' | 'sibling' | 'lowest'): Plant =>
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
