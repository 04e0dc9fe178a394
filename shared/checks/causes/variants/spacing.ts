import type { OverheadSection, PhasePosition } from '../../../engine/index';

/** Mean spacings of one circuit's phases, m. */
export interface MeanSpacing {
  geometricM: number;
  arithmeticM: number;
}

/**
 * Geometric and arithmetic mean of the three distances between a circuit's phases.
 *
 * @param section the overhead section
 * @param circuit the circuit's number
 * @returns null when the circuit has not exactly three phases, or two of them coincide
 */
export function spacingOf(section: OverheadSection, circuit: number): MeanSpacing | null {
  const phases = section.positions.filter(
    (position): position is PhasePosition => position.kind === 'phase' && position.circuit === circuit,
  );
  const [a, b, c] = phases;
  if (a === undefined || b === undefined || c === undefined || phases.length !== 3) return null;
  const distances = [distanceM(a, b), distanceM(b, c), distanceM(a, c)];
  const product = distances.reduce((sum, distance) => sum * distance, 1);
  if (!(product > 0)) return null;
  const sum = distances.reduce((total, distance) => total + distance, 0);
  return { geometricM: Math.cbrt(product), arithmeticM: sum / 3 };
}

/** Distance of two positions at their mean heights, m. */
export function distanceM(one: PhasePosition, other: PhasePosition): number {
  const up = one.attachmentHeightM - other.attachmentHeightM - (2 / 3) * (one.sagM - other.sagM);
  return Math.hypot(one.horizontalM - other.horizontalM, up);
}
