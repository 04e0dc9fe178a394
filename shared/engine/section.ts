import { packedLength, rowStart } from '../numerics/packed';
import { EPSILON_0 } from './constants';
import { fail, succeed } from './failures';
import { fillGeometry, fillSeries } from './primitive';
import { reduceSeries, reduceShunt } from './reduction';
import type { Failure, Mutual, OverheadSection, Result, SectionConstants, SequenceConstants } from './types';
import { checkFrequency, checkSection } from './validate';
import { placeWires } from './wires';
import { Workspace } from './workspace';

/** The one workspace of this thread. */
const workspace = new Workspace();

/** The workspace that all solves of this thread share; whoever fills it reads it before the next solve. */
export function sharedWorkspace(): Workspace {
  return workspace;
}

/** µS/km of a capacitance matrix element in units of 2πε₀ at angular frequency ω. */
export function susceptanceFactor(omega: number): number {
  return omega * 2 * Math.PI * EPSILON_0 * 1e9;
}

/**
 * Runs geometry → wires → matrices → phases for a section. Afterwards the leading rows of the workspace hold the
 * phase impedance (Ω/km) and the phase capacitance in units of 2πε₀.
 *
 * @returns the workspace, or the failure
 */
export function solvePhases(s: OverheadSection, frequencyHz: number): Workspace | Failure {
  const fault = checkFrequency(frequencyHz) ?? checkSection(s);
  if (fault) return fault;
  const w = workspace;
  const omega = 2 * Math.PI * frequencyHz;
  placeWires(s, omega, w);
  const failure = fillGeometry(w) ?? reduceShunt(w);
  if (failure) return failure;
  fillSeries(w, omega, s.earthResistivityOhmM);
  return reduceSeries(w) ?? notFinite(w) ?? w;
}

/** The last guard: whatever slipped through all checks ends here, not as NaN in a result. */
function notFinite(w: Workspace): Failure | null {
  let sum = 0;
  const count = packedLength(w.phases);
  for (let e = 0; e < count; e++) sum += (w.zr[e] as number) + (w.zi[e] as number) + (w.p[e] as number);
  return Number.isFinite(sum)
    ? null
    : fail('ill-conditioned', {}, 'the matrices have no finite solution', Infinity);
}

/** Sum of a circuit's three diagonal elements. */
function diagonalSum(a: Float64Array, first: number): number {
  const i = first;
  return (
    (a[rowStart(i) + i] as number) +
    (a[rowStart(i + 1) + i + 1] as number) +
    (a[rowStart(i + 2) + i + 2] as number)
  );
}

/** Sum of a circuit's three elements off the diagonal (one triangle). */
function offDiagonalSum(a: Float64Array, first: number): number {
  const second = rowStart(first + 1) + first;
  const third = rowStart(first + 2) + first;
  return (a[second] as number) + (a[third] as number) + (a[third + 1] as number);
}

/** Sum of the nine elements that couple two circuits. */
function blockSum(a: Float64Array, high: number, low: number): number {
  let sum = 0;
  for (let i = high; i < high + 3; i++) {
    const row = rowStart(i) + low;
    sum += (a[row] as number) + (a[row + 1] as number) + (a[row + 2] as number);
  }
  return sum;
}

/**
 * Positive and zero sequence of one circuit from its 3 × 3 block: mean self −/+ mean mutual.
 *
 * @param w solved workspace
 * @param first row of the circuit's phase a
 * @param siemens µS/km a unit of capacitance, see `susceptanceFactor`
 * @param out receives the six values
 */
export function sequenceOf(w: Workspace, first: number, siemens: number, out: SequenceConstants): void {
  const dr = diagonalSum(w.zr, first);
  const di = diagonalSum(w.zi, first);
  const db = diagonalSum(w.p, first);
  const or = offDiagonalSum(w.zr, first);
  const oi = offDiagonalSum(w.zi, first);
  const ob = offDiagonalSum(w.p, first);
  out.r1 = (dr - or) / 3;
  out.x1 = (di - oi) / 3;
  out.b1 = (siemens * (db - ob)) / 3;
  out.r0 = (dr + 2 * or) / 3;
  out.x0 = (di + 2 * oi) / 3;
  out.b0 = (siemens * (db + 2 * ob)) / 3;
}

/** Reads the sequence constants out of a workspace that `solvePhases` filled. */
export function readSequence(w: Workspace, frequencyHz: number): SectionConstants {
  const siemens = susceptanceFactor(2 * Math.PI * frequencyHz);
  const circuits: SequenceConstants[] = [];
  const mutual: Mutual[] = [];
  for (let c = 0; c < w.phases; c += 3) {
    const values: SequenceConstants = { r1: 0, x1: 0, b1: 0, r0: 0, x0: 0, b0: 0 };
    sequenceOf(w, c, siemens, values);
    circuits.push(values);
  }
  for (let i = 0; i < w.phases; i += 3) {
    for (let j = i + 3; j < w.phases; j += 3) {
      mutual.push({
        circuits: [i / 3 + 1, j / 3 + 1],
        r0m: blockSum(w.zr, j, i) / 3,
        x0m: blockSum(w.zi, j, i) / 3,
        b0m: (siemens * blockSum(w.p, j, i)) / 3,
      });
    }
  }
  return { circuits, mutual };
}

/**
 * Sequence constants of an overhead section from its geometry: every subconductor and ground wire a wire of its own,
 * images, Carson's earth return, bundles joined, ground wires eliminated. Z0 is the self value with no zero-sequence
 * current in the other circuits, B0 with the others at zero potential.
 *
 * @param s the section
 * @param frequencyHz 0.1 Hz to 1 MHz
 * @returns per circuit r1, x1, r0, x0 in Ω/km and b1, b0 in µS/km, and the mutuals; or the typed failure
 */
export function solveSection(s: OverheadSection, frequencyHz: number): Result<SectionConstants> {
  const w = solvePhases(s, frequencyHz);
  return 'ok' in w ? w : succeed(readSequence(w, frequencyHz));
}
