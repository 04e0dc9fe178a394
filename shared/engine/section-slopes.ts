import type { Complex } from '../numerics/complex';
import { conductorSlopes, sameConductor } from './conductor-slopes';
import { SAG_SHARE } from './constants';
import { readSequence, solvePhases, susceptanceFactor } from './section';
import type { UncertainInput } from './sensitivity-types';
import { Slopes } from './slopes';
import type { ConductorData, Failure, OverheadSection, SectionConstants } from './types';

const slopes = new Slopes();

/**
 * Takes one input's slopes: the vector (r, x, b a quantity, see `Slopes`) stands at `values[start …]`, times `factor`,
 * and is only lent. `position` is −1 for inputs that belong to the whole section.
 */
export type SlopeVisitor = (
  input: UncertainInput,
  values: Float64Array,
  start: number,
  factor: number,
  position: number,
  conductor: ConductorData | null,
) => void;

/** Slope vectors of one conductor's data, grown as needed and used again. */
let weight = new Float64Array(0);
let row = new Float64Array(0);

/** Slope vector of an input that moves Z_ii by `dz` (Ω/km) and P_ii by `dp` on all wires that share a conductor. */
function fillRow(length: number, dz: Complex, dp: number): void {
  for (let q = 0; q < length; q += 3) {
    const wr = weight[q] as number;
    const wi = weight[q + 1] as number;
    row[q] = wr * dz[0] - wi * dz[1];
    row[q + 1] = wr * dz[1] + wi * dz[0];
    row[q + 2] = (weight[q + 2] as number) * dp;
  }
}

/** Inputs of one conductor. A ground wire's resistance has an uncertainty of its own, which covers temperature. */
function visitConductor(
  c: ConductorData,
  ground: boolean,
  position: number,
  omega: number,
  length: number,
  visit: SlopeVisitor,
): void {
  // Z_ii and P_ii of every wire with this conductor move alike, so the summed self weights are all that is needed.
  const slope = conductorSlopes(c, omega);
  // P_ii = ln(2h/r) falls by one a unit of ln r, so B grows.
  fillRow(length, slope.byLogDiameter, susceptanceFactor(omega));
  visit('diameter', row, 0, 1, position, c);
  if (c.model === 'handbook') {
    fillRow(length, slope.byLogGmr, 0);
    visit('gmr', row, 0, 1, position, c);
  }
  fillRow(length, slope.byLogResistance, 0);
  if (ground) visit('ground-wire-resistance', row, 0, 1, position, c);
  else {
    visit('ac-resistance', row, 0, 1, position, c);
    visit('temperature', row, 0, slope.logResistancePerK, position, c);
  }
}

/** Whether an earlier position of the same kind has the same conductor. */
function seenBefore(s: OverheadSection, index: number): boolean {
  const p = s.positions[index];
  for (let i = 0; i < index; i++) {
    const q = s.positions[i];
    if (p && q && q.kind === p.kind && sameConductor(q.conductor, p.conductor)) return true;
  }
  return false;
}

/** Sums the self weights of all positions that share the conductor of the one at `index`. */
function gatherWeights(s: OverheadSection, index: number, length: number): void {
  const p = s.positions[index];
  // Earlier positions were ruled out by `seenBefore`, so the search starts at the first of the kind.
  weight.fill(0);
  for (let i = index; i < s.positions.length; i++) {
    const q = s.positions[i];
    if (!p || !q || q.kind !== p.kind || !sameConductor(q.conductor, p.conductor)) continue;
    for (let e = 0; e < length; e++)
      weight[e] = (weight[e] as number) + (slopes.self[i * length + e] as number);
  }
}

/**
 * Solves a section and gives the slopes of its sequence values with respect to every input, analytically: one
 * back-substitution a pattern and one pass over the wire pairs.
 *
 * @param s the section
 * @param frequencyHz 0.1 Hz to 1 MHz
 * @param visit called once an input
 * @returns the constants, or the typed failure (nothing is visited then)
 */
export function visitSlopes(
  s: OverheadSection,
  frequencyHz: number,
  visit: SlopeVisitor,
): SectionConstants | Failure {
  const w = solvePhases(s, frequencyHz);
  if ('ok' in w) return w;
  const omega = 2 * Math.PI * frequencyHz;
  const constants = readSequence(w, frequencyHz);
  slopes.fill(s, w, frequencyHz);
  const length = slopes.length;
  visit('height', slopes.height, 0, 1, -1, null);
  // The average height falls by two thirds of the sag, on all wires of the section alike.
  visit('sag', slopes.height, 0, -SAG_SHARE, -1, null);
  visit('earth-resistivity', slopes.logResistivity, 0, 1, -1, null);
  if (weight.length < length) {
    weight = new Float64Array(length);
    row = new Float64Array(length);
  }
  for (let i = 0; i < s.positions.length; i++) {
    const p = s.positions[i];
    if (!p) continue;
    visit('offset', slopes.offset, i * length, 1, i, null);
    if (seenBefore(s, i)) continue;
    gatherWeights(s, i, length);
    visitConductor(p.conductor, p.kind === 'ground-wire', i, omega, length, visit);
  }
  return constants;
}
