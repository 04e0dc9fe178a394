import { eliminateComplex, eliminateReal, rowStart } from '../numerics/packed';
import { fail } from './failures';
import type { Failure, OverheadSection } from './types';
import type { Workspace } from './workspace';

/** Condition estimates above this leave too few digits to be answered for. */
const WORST_CONDITION = 1e10;

/**
 * Subtracts from each further subconductor's row and column those of its bundle's first one, in place. What is left
 * for it is the voltage difference within the bundle, which is zero; its new current unknown stays its own, the first
 * one's becomes the bundle's sum.
 */
function joinBundles(a: Float64Array, leader: Int32Array, phases: number, n: number): void {
  // From the last row up: every entry that a row needs of others is still untransformed then.
  for (let i = n - 1; i >= phases; i--) {
    const row = rowStart(i);
    const li = leader[i] as number;
    const member = li !== i;
    for (let j = phases; j <= i; j++) {
      const lj = leader[j] as number;
      let value = a[row + j] as number;
      if (lj !== j) value -= a[row + lj] as number;
      if (member) {
        value -= a[rowStart(j) + li] as number;
        if (lj !== j) value += a[li >= lj ? rowStart(li) + lj : rowStart(lj) + li] as number;
      }
      a[row + j] = value;
    }
    if (!member) continue;
    for (let j = 0; j < phases; j++) {
      a[row + j] = (a[row + j] as number) - (a[li >= j ? rowStart(li) + j : rowStart(j) + li] as number);
    }
  }
}

/**
 * Joins the bundles and takes the ground wires out: eliminated at zero voltage when continuous, left out of Z when
 * segmented (they carry no current then) but always at ground potential in P. Afterwards the leading rows of the
 * workspace's triangles hold phase impedance (Ω/km) and phase potential coefficients.
 *
 * @returns a failure when a matrix is singular or nearly so, or null
 */
export function reduce(w: Workspace, bonding: OverheadSection['groundWireBonding']): Failure | null {
  const n = w.wires;
  const nz = bonding === 'segmented' ? n - w.groundWires : n;
  if (n > w.phases) {
    joinBundles(w.zr, w.leader, w.phases, nz);
    joinBundles(w.zi, w.leader, w.phases, nz);
    joinBundles(w.p, w.leader, w.phases, n);
  }
  const series = eliminateComplex(w.zr, w.zi, nz, w.phases);
  if (!(series < WORST_CONDITION)) return illConditioned('series impedance', series);
  const shunt = eliminateReal(w.p, n, w.phases);
  if (!(shunt < WORST_CONDITION)) return illConditioned('potential coefficients', shunt);
  return null;
}

/** The failure that says that a matrix cannot be solved with any digits left. */
export function illConditioned(what: string, condition: number): Failure {
  const size = Number.isFinite(condition) ? `condition about ${condition.toExponential(1)}` : 'singular';
  return fail('ill-conditioned', {}, `the matrix of ${what} is ${size}`, condition);
}
