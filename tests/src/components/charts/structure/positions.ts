import type { DrawnPosition } from '../../../../../src/components/charts/structure/drawn-position';

/** A phase position for drawing tests: letter and circuit, metres across, high and of sag. */
export function phase(
  label: string,
  circuit: number,
  horizontalM: number,
  attachmentHeightM: number,
  sagM: number,
  bundle: { count: number; spacingM: number } = { count: 1, spacingM: 0 },
): DrawnPosition {
  return {
    id: `${circuit}${label}`,
    kind: 'phase',
    label,
    circuit,
    horizontalM,
    attachmentHeightM,
    sagM,
    bundleCount: bundle.count,
    bundleSpacingM: bundle.spacingM,
  };
}

export function groundWire(
  label: string,
  horizontalM: number,
  attachmentHeightM: number,
  sagM: number,
): DrawnPosition {
  return { ...phase(label, 0, horizontalM, attachmentHeightM, sagM), id: `gw${label}`, kind: 'ground-wire' };
}

const PAIR = { count: 2, spacingM: 0.4572 };

export const FLAT: readonly DrawnPosition[] = [
  phase('a', 1, -9, 24, 9, PAIR),
  phase('b', 1, 0, 24, 9, PAIR),
  phase('c', 1, 9, 24, 9, PAIR),
  groundWire('1', -6.5, 30, 6.5),
  groundWire('2', 6.5, 30, 6.5),
];

export const DELTA: readonly DrawnPosition[] = [
  phase('a', 1, -4.6, 19, 6.2),
  phase('b', 1, 0, 24, 6.2),
  phase('c', 1, 4.6, 12, 6.2),
  groundWire('1', 0, 31, 4.6),
];

export const TWO_CIRCUITS: readonly DrawnPosition[] = [
  phase('a', 1, -5.2, 38, 8, PAIR),
  phase('b', 1, -7.4, 30, 8, PAIR),
  phase('c', 1, -5.6, 22, 8, PAIR),
  phase('a', 2, 5.2, 22, 8, PAIR),
  phase('b', 2, 7.4, 30, 8, PAIR),
  phase('c', 2, 5.6, 38, 8, PAIR),
  groundWire('1', 0, 45, 6),
];
