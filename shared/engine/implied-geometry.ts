import { EPSILON_0, MU_0 } from './constants';
import { bundleProduct, type HandCheck } from './hand-check';

/** What the declared positive-sequence values are read against. */
export interface ImpliedGeometryInput {
  /** Declared reactance, Ω/km, and susceptance, µS/km. */
  x1: number;
  b1: number;
  frequencyHz: number;
  /** Outer diameter of one subconductor, mm. */
  diameterMm: number;
  bundleCount: number;
  bundleSpacingM: number;
  /** Hand check of the drawn geometry: what it misses is taken off the declared values first. */
  reference?: Pick<HandCheck, 'x1' | 'b1'>;
}

/** The geometry that declared X1 and B1 would need. */
export interface ImpliedGeometry {
  /** Geometric mean distance of the phases, m. */
  meanSpacingM: number;
  /** GMR of one subconductor, mm. */
  gmrMm: number;
  /** GMR ÷ outer radius: 0.78 for a solid wire, 0.81–0.83 for common stranded ones, never above 1. */
  gmrOverRadius: number;
}

/**
 * Mean phase spacing and conductor GMR which declared X1 and B1 need, by the shortcut read backwards: B1 and the
 * radius give the spacing, X1 and the spacing give the GMR. With a reference, the shortcut's own error (earth, ground
 * wires, bundle) is removed: additively from X1 and from 1/B1, which both are sums of logarithms.
 *
 * @param input declared values and the conductor
 * @returns the implied geometry, or null when no geometry at all gives such values
 * @example
 * impliedGeometry({ x1: 0.505925, b1: 3.228122, frequencyHz: 60, diameterMm: 30.4, bundleCount: 1, bundleSpacingM: 0 })?.meanSpacingM // → 10.08
 */
export function impliedGeometry(input: ImpliedGeometryInput): ImpliedGeometry | null {
  const { bundleCount, bundleSpacingM, reference } = input;
  const omega = 2 * Math.PI * input.frequencyHz;
  const radiusM = input.diameterMm / 2000;
  const product = bundleProduct(bundleCount, bundleSpacingM);
  const x1 = input.x1 - (reference ? reference.x1.full - reference.x1.shortcut : 0);
  const inverse = 1 / input.b1 - (reference ? 1 / reference.b1.full - 1 / reference.b1.shortcut : 0);
  const bundleRadiusM = (radiusM * product) ** (1 / bundleCount);
  const meanSpacingM = bundleRadiusM * Math.exp(omega * 2 * Math.PI * EPSILON_0 * 1e9 * inverse);
  const bundleGmrM = meanSpacingM * Math.exp((-2 * Math.PI * x1) / (1000 * omega * MU_0));
  const gmrM = bundleGmrM ** bundleCount / product;
  const usable = input.b1 > 0 && [meanSpacingM, gmrM].every((v) => Number.isFinite(v) && v > 0);
  return usable ? { meanSpacingM, gmrMm: gmrM * 1000, gmrOverRadius: gmrM / radiusM } : null;
}
