import type { GroundWirePosition, OverheadSection, PhasePosition } from '../../../engine/index';
import { withUnit } from '../../words';

/** A position of a section. */
export type Position = PhasePosition | GroundWirePosition;

/** A coordinate that can be off. */
export type Coordinate = 'horizontalM' | 'attachmentHeightM' | 'sagM';

/** One coordinate of one position put right. */
export interface Candidate {
  index: number;
  field: Coordinate;
  value: number;
  /** Log prior of this kind of slip. */
  prior: number;
  words: () => string;
}

const NAMES: Readonly<Record<Coordinate, string>> = {
  horizontalM: 'offset',
  attachmentHeightM: 'height',
  sagM: 'sag',
};

/** What a position is called in a sentence. */
export function nameOf(position: Position, index: number): string {
  return position.kind === 'phase'
    ? `phase ${position.phase} of circuit ${position.circuit}`
    : `the ground wire at position ${index + 1}`;
}

/** "the height of phase a of circuit 1 is 24 m, not 42 m". */
export function coordinateWords(position: Position, index: number, field: Coordinate, value: number): string {
  return `the ${NAMES[field]} of ${nameOf(position, index)} is ${withUnit(value, 'm', 4)}, not ${withUnit(position[field], 'm', 4)}`;
}

/**
 * Every way in which one coordinate of a section may be off: its sign, two digits, a sibling's value in its place or
 * its own lost to one, heights from the lowest arm, a decimal point.
 */
export function candidatesOf(section: OverheadSection): Candidate[] {
  const heights = section.positions.map(({ attachmentHeightM }) => attachmentHeightM).sort((a, b) => a - b);
  const [lowest = 0, second = lowest] = heights;
  return section.positions.flatMap((position, index) =>
    (['horizontalM', 'attachmentHeightM', 'sagM'] as const).flatMap((field) => {
      const found = new Map<number, { prior: number }>();
      const add = (value: number, prior: number): void => {
        const key = Number(value.toPrecision(9));
        if (!isPossible(field, key) || Math.abs(key - position[field]) < 1e-6) return;
        if (prior > (found.get(key)?.prior ?? -Infinity)) found.set(key, { prior });
      };
      if (field === 'horizontalM') add(-position[field], 0);
      for (const value of digitSwaps(position[field])) add(value, -0.7);
      for (const value of siblingValues(section, position, field)) add(value, -1);
      for (const value of patternValues(section, position, field)) add(value, -1);
      if (field === 'attachmentHeightM')
        add(position[field] + (position[field] === lowest ? second : lowest), -0.5);
      if (field !== 'sagM') for (const factor of [10, 0.1]) add(position[field] * factor, -1.5);
      return [...found].map(([value, { prior }]) => ({
        index,
        field,
        value,
        prior,
        words: () => coordinateWords(position, index, field, value),
      }));
    }),
  );
}

function isPossible(field: Coordinate, value: number): boolean {
  if (field === 'horizontalM') return Math.abs(value) <= 100;
  return field === 'sagM' ? value >= 0 && value <= 100 : value > 0 && value <= 250;
}

/** A number with two of its digits in each other's place. */
export function digitSwaps(value: number): number[] {
  const text = String(Math.abs(value));
  if (text.includes('e')) return [];
  const places = [...text].flatMap((sign, at) => (sign === '.' ? [] : [at])).slice(0, 6);
  const swapped: number[] = [];
  places.forEach((one, order) => {
    for (const other of places.slice(order + 1)) {
      if (text[one] === text[other]) continue;
      const signs = [...text];
      [signs[one], signs[other]] = [signs[other] ?? '', signs[one] ?? ''];
      swapped.push(Math.sign(value) * Number(signs.join('')));
    }
  });
  return swapped;
}

function siblingValues(section: OverheadSection, position: Position, field: Coordinate): number[] {
  const values = section.positions.filter((other) => other !== position).map((other) => other[field]);
  return field === 'horizontalM' ? values.flatMap((value) => [value, -value]) : values;
}

/** Values that make a circuit's three phases evenly spaced, for a value lost to a sibling's. */
function patternValues(section: OverheadSection, position: Position, field: Coordinate): number[] {
  if (position.kind !== 'phase' || field === 'sagM') return [];
  const [one, two] = section.positions
    .filter((other) => other.kind === 'phase' && other.circuit === position.circuit && other !== position)
    .map((other) => other[field]);
  if (one === undefined || two === undefined) return [];
  return [2 * one - two, 2 * two - one, (one + two) / 2];
}
