const DEGREES_PER_TOLERANCE = 4;
const STEEPEST = 14;

/**
 * How far the beam tilts, in degrees as SVG turns (negative: left side down). Level while the declared
 * value (left) differs from the recomputed (right) by no more than the tolerance; beyond, 4° for each
 * tolerance, 14° at most, the heavier side down. Both arguments are relative (0.015 is 1.5 %).
 */
export function beamAngle(difference: number, tolerance: number): number {
  if (!Number.isFinite(difference)) return 0;
  const size = Math.abs(difference);
  if (size <= tolerance) return 0;
  const tilt = tolerance > 0 ? (DEGREES_PER_TOLERANCE * size) / tolerance : STEEPEST;
  return -Math.sign(difference) * Math.min(tilt, STEEPEST);
}
