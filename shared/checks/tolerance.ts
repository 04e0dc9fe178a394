import type { Tolerance } from './rule-set';

/** A tolerance with what it was made of; all are shares of the recomputed value. */
export interface ToleranceInUse {
  /** What is used. */
  total: number;
  /** The administrator's. */
  administrator: number;
  /** Half the plausible range ÷ recomputed, before the cap. */
  inputs: number;
  /** The input that moves the recomputed value most. */
  dominantInput: string;
  /** Half a unit of the declared value's last digit ÷ recomputed. */
  rounding: number;
}

/**
 * Tolerance of one declared value: the larger of the administrator's and the one that the inputs' uncertainty
 * explains (capped), and half a unit of the last digit as written.
 *
 * @param rule the administrator's tolerance and its cap
 * @param recomputed value from the geometry
 * @param halfRange half the recomputed value's plausible range, in its unit
 * @param halfDigit half a unit of the declared value's last digit, in the same unit
 * @param dominantInput name of the input that dominates the range
 */
export function toleranceInUse(
  rule: Tolerance,
  recomputed: number,
  halfRange: number,
  halfDigit: number,
  dominantInput: string,
): ToleranceInUse {
  const size = Math.abs(recomputed);
  const inputs = size > 0 ? halfRange / size : 0;
  const rounding = size > 0 ? halfDigit / size : 0;
  const total = Math.max(rule.relative, Math.min(inputs, rule.cap)) + rounding;
  return { total, administrator: rule.relative, inputs, dominantInput, rounding };
}
