import { eliminateComplex, eliminateReal, invertReal, rowStart } from '../numerics/packed';
import { fail } from './failures';
import type { Failure } from './types';
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
 * Joins the bundles in Z and takes the ground wires out at zero voltage (segmented ones, which carry no current, are
 * not in it). Afterwards the leading rows of the triangle hold the phase impedance, Ω/km.
 *
 * @returns a failure when the matrix is singular or nearly so, or null
 */
export function reduceSeries(w: Workspace): Failure | null {
  const n = w.seriesWires;
  joinBundles(w.zr, w.leader, w.phases, n);
  joinBundles(w.zi, w.leader, w.phases, n);
  const condition = eliminateComplex(w.zr, w.zi, n, w.phases);
  return condition < WORST_CONDITION ? null : illConditioned('series impedance', condition);
}

/**
 * Joins the bundles in P, takes the ground wires out (at ground potential, segmented or not) and inverts what is left.
 * Afterwards the leading rows of the triangle hold the phase capacitance in units of 2πε₀.
 *
 * @returns a failure when the matrix is singular or nearly so, or null
 */
export function reduceShunt(w: Workspace): Failure | null {
  joinBundles(w.p, w.leader, w.phases, w.wires);
  const condition = Math.max(eliminateReal(w.p, w.wires, w.phases), invertReal(w.p, w.phases));
  return condition < WORST_CONDITION ? null : illConditioned('potential coefficients', condition);
}

/** The failure that says that a matrix cannot be solved with any digits left. */
export function illConditioned(what: string, condition: number): Failure {
  const size = Number.isFinite(condition) ? `condition about ${condition.toExponential(1)}` : 'singular';
  return fail('ill-conditioned', {}, `the matrix of ${what} is ${size}`, condition);
}
