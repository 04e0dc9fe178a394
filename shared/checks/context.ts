import type { Failure, LineConstants, SequenceConstants } from '../engine/types';
import type { DeclaredValue, NormalisedCircuit, NormalisedLine, NormalisedMutual } from '../filing/types';
import type { ClassMatch } from './bands/match-class';
import type { LineParameter, MutualParameter } from './parameters';
import type { RuleSet } from './rule-set';
import type { RecomputedValues } from './types';
import type { Weighing } from './weigh';

/** Half a plausible range and the input that dominates it. */
export interface Spread {
  /** Ω/km or µS/km. */
  halfRange: number;
  dominant: string;
}

/** How far each recomputed value moves when the inputs move within what they are known to. */
export interface Spreads {
  circuits: readonly Readonly<Record<LineParameter, Spread>>[];
  mutual: readonly Readonly<Record<MutualParameter, Spread>>[];
}

/** What the geometry gives, or why it gives nothing. */
export type Recomputation =
  { ok: true; constants: LineConstants; spreads: Spreads } | { ok: false; failure: Failure | null };

/** What every rule of one line can look at. */
export interface LineContext {
  line: NormalisedLine;
  rules: RuleSet;
  /** The voltage class, null when none is near. */
  match: ClassMatch | null;
  recomputation: Recomputation;
  /** False when cable makes up more than a tenth of the length: overhead physics and bands do not apply. */
  isOverhead: boolean;
}

/** What every rule of one circuit can look at. */
export interface CircuitContext {
  lineContext: LineContext;
  circuit: NormalisedCircuit;
  /** Declared values, Ω/km and µS/km. */
  declared: Partial<Record<LineParameter, number>>;
  constants: SequenceConstants | null;
  recomputed: RecomputedValues | null;
  weighings: Partial<Record<LineParameter, Weighing>>;
}

/** What every rule of a pair of circuits can look at. */
export interface PairContext {
  lineContext: LineContext;
  mutual: NormalisedMutual;
  /** The two circuits' declared values, in the order of `mutual.circuits`. */
  selves: readonly Partial<Record<LineParameter, number>>[];
  weighings: Partial<Record<MutualParameter, Weighing>>;
}

/** Longest share of cable that leaves a line an overhead line. */
export const CABLE_SHARE_LIMIT = 0.1;

/** Half a unit of the last digit as a share of the value; 0 for a value of 0. */
export function roundingShare(value: DeclaredValue | undefined): number {
  return value === undefined || value.perKm === 0 ? 0 : value.halfDigitPerKm / Math.abs(value.perKm);
}
