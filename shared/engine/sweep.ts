import { succeed } from './failures';
import { fillGeometry, fillSeries, findTwins } from './primitive';
import { reduceSeries, reduceShunt } from './reduction';
import { sequenceOf, sharedWorkspace, susceptanceFactor } from './section';
import type { ConductorData, Failure, OverheadSection, Result, SequenceConstants } from './types';
import { checkFrequency, checkSection } from './validate';
import { placeWires, refreshInternal } from './wires';
import type { Workspace } from './workspace';

/** One circuit's constants over the frequencies of a sweep. */
export interface SweepCircuit {
  /** Ω/km */
  r1: Float64Array;
  r0: Float64Array;
  /** mH/km */
  l1: Float64Array;
  l0: Float64Array;
  /** µS/km */
  b1: Float64Array;
  b0: Float64Array;
}

/** R, L and B over frequency. */
export interface SweepTable {
  frequenciesHz: Float64Array;
  circuits: SweepCircuit[];
  /**
   * `as-filed`: handbook conductors keep R and GMR at every frequency. `tube`: all conductors with skin effect.
   * `mixed`: those with the data for it, the rest as filed.
   */
  conductors: 'as-filed' | 'tube' | 'mixed';
}

/** The conductor as a tube where its data allow, with the temperature that its table names (20 °C for lack of one). */
function asTube(c: ConductorData): ConductorData {
  const ready =
    c.model === 'handbook' && (c.dcResistance20OhmPerKm ?? 0) > 0 && (c.coreDiameterMm ?? 0) < c.diameterMm;
  return ready ? { ...c, model: 'tube', temperatureC: c.temperatureC ?? 20 } : c;
}

/**
 * The section with skin effect wherever the data allow it, for a plot over a wide range of frequencies.
 *
 * @param s the section
 * @returns a copy, and whether all, some or no conductors have skin effect in it
 */
export function withSkinEffect(s: OverheadSection): {
  section: OverheadSection;
  conductors: SweepTable['conductors'];
} {
  const positions = s.positions.map((p) => ({ ...p, conductor: asTube(p.conductor) }));
  const tubes = positions.filter((p) => p.conductor.model === 'tube').length;
  const conductors = tubes === 0 ? 'as-filed' : tubes === positions.length ? 'tube' : 'mixed';
  return { section: { ...s, positions }, conductors };
}

function createCircuit(points: number): SweepCircuit {
  const column = (): Float64Array => new Float64Array(points);
  return { r1: column(), r0: column(), l1: column(), l0: column(), b1: column(), b0: column() };
}

const values: SequenceConstants = { r1: 0, x1: 0, b1: 0, r0: 0, x0: 0, b0: 0 };

/** Solves one frequency on the geometry that stands in the workspace and writes row k of the table. */
function solvePoint(s: OverheadSection, w: Workspace, table: SweepTable, k: number): Failure | null {
  const omega = 2 * Math.PI * (table.frequenciesHz[k] as number);
  refreshInternal(s, omega, w);
  fillSeries(w, omega, s.earthResistivityOhmM, true);
  const failure = reduceSeries(w);
  if (failure) return failure;
  const siemens = susceptanceFactor(omega);
  table.circuits.forEach((circuit, c) => {
    sequenceOf(w, 3 * c, siemens, values);
    circuit.r1[k] = values.r1;
    circuit.r0[k] = values.r0;
    circuit.l1[k] = (1000 * values.x1) / omega;
    circuit.l0[k] = (1000 * values.x0) / omega;
    circuit.b1[k] = values.b1;
    circuit.b0[k] = values.b0;
  });
  return null;
}

/**
 * R1, L1, R0, L0 and B over frequency. What the places of the wires alone decide (distances, logarithms, potential
 * coefficients and their reduction) is computed once.
 *
 * @param s the section
 * @param frequenciesHz any number of frequencies, each 0.1 Hz to 1 MHz
 * @param skinEffect whether handbook conductors with the data for it are taken as tubes, which is right over a wide
 * range; the table says what was done
 * @returns the table; or the typed failure
 */
export function sweep(
  s: OverheadSection,
  frequenciesHz: ArrayLike<number>,
  skinEffect = false,
): Result<SweepTable> {
  const fault = checkSection(s);
  if (fault) return fault;
  for (let k = 0; k < frequenciesHz.length; k++) {
    const bad = checkFrequency(frequenciesHz[k] as number);
    if (bad) return bad;
  }
  // A copy with skin effect rests on data that the model as filed never looked at.
  const chosen = skinEffect ? withSkinEffect(s) : { section: s, conductors: undefined };
  const unfit = skinEffect ? checkSection(chosen.section) : null;
  if (unfit) return unfit;
  const w = sharedWorkspace();
  placeWires(chosen.section, 2 * Math.PI, w);
  const failure = fillGeometry(w) ?? reduceShunt(w);
  if (failure) return failure;
  findTwins(w);
  const points = frequenciesHz.length;
  const table: SweepTable = {
    frequenciesHz: Float64Array.from(frequenciesHz),
    circuits: Array.from({ length: w.phases / 3 }, () => createCircuit(points)),
    conductors: chosen.conductors ?? filedModels(s),
  };
  for (let k = 0; k < points; k++) {
    const bad = solvePoint(chosen.section, w, table, k);
    if (bad) return bad;
  }
  return succeed(table);
}

/** What `conductors` says of a section that is taken as filed. */
function filedModels(s: OverheadSection): SweepTable['conductors'] {
  return s.positions.every((p) => p.conductor.model === 'tube') ? 'tube' : 'as-filed';
}

/**
 * Frequencies evenly spaced in their logarithm, both ends included.
 *
 * @param lowHz first frequency
 * @param highHz last frequency
 * @param points number of points, at least 2
 * @example
 * Array.from(logarithmicGrid(1, 100, 3)) // → [1,10,100]
 */
export function logarithmicGrid(lowHz: number, highHz: number, points: number): Float64Array {
  const grid = new Float64Array(points);
  for (let k = 0; k < points; k++) grid[k] = lowHz * (highHz / lowHz) ** (k / (points - 1));
  if (points > 1) grid[points - 1] = highHz;
  return grid;
}
