import { conductorSlopes, sameConductor } from './conductor-slopes';
import { SAG_SHARE } from './constants';
import { readSequence, solvePhases, susceptanceFactor } from './section';
import type { UncertainInput } from './sensitivity-types';
import { Slopes } from './slopes';
import type { Complex } from '../numerics/complex';
import type { ConductorData, Failure, OverheadSection, SectionConstants } from './types';
import type { Workspace } from './workspace';

const slopes = new Slopes();

/** One input of a section and its slope vector (r, x, b a quantity, see `Slopes`). */
export interface SlopeRow {
  input: UncertainInput;
  unit: 'm' | 'K' | 'relative';
  position?: number;
  conductor?: ConductorData;
  values: Float64Array;
}

/** A solved section with the slopes of all its inputs. */
export interface SolvedSlopes {
  constants: SectionConstants;
  rows: SlopeRow[];
}

/** Conductors of a section, phase conductors apart from ground wires, each with its wires. */
interface ConductorGroup {
  conductor: ConductorData;
  ground: boolean;
  position: number;
  /** Sum of the self weights over the group's wires. */
  weight: Float64Array;
}

/** Sums the self weights of wires that share a conductor. */
function groupConductors(s: OverheadSection, w: Workspace): ConductorGroup[] {
  const groups: ConductorGroup[] = [];
  const length = slopes.length;
  for (let i = 0; i < w.wires; i++) {
    const index = w.position[i] as number;
    const position = s.positions[index];
    if (!position) continue;
    const ground = position.kind === 'ground-wire';
    let group = groups.find((g) => g.ground === ground && sameConductor(g.conductor, position.conductor));
    if (!group) {
      group = { conductor: position.conductor, ground, position: index, weight: new Float64Array(length) };
      groups.push(group);
    }
    for (let q = 0; q < length; q++) {
      group.weight[q] = (group.weight[q] as number) + (slopes.self[i * length + q] as number);
    }
  }
  return groups;
}

/** Slope vector of an input that moves Z_ii by `dz` (Ω/km) and P_ii by `dp` on all wires of a group. */
function selfRow(weight: Float64Array, dz: Complex, dp: number, shunt: number): Float64Array {
  const values = new Float64Array(weight.length);
  for (let q = 0; q < weight.length; q += 3) {
    const wr = weight[q] as number;
    const wi = weight[q + 1] as number;
    values[q] = wr * dz[0] - wi * dz[1];
    values[q + 1] = wr * dz[1] + wi * dz[0];
    values[q + 2] = shunt * (weight[q + 2] as number) * dp;
  }
  return values;
}

function scaled(values: Float64Array, factor: number): Float64Array {
  return values.map((v) => v * factor);
}

/** Rows of one conductor's data. A ground wire's resistance has an uncertainty of its own that covers temperature. */
function conductorRows(group: ConductorGroup, omega: number): SlopeRow[] {
  const { conductor, position, weight } = group;
  const shunt = -susceptanceFactor(omega);
  const slope = conductorSlopes(conductor, omega);
  const resistance = selfRow(weight, slope.byLogResistance, 0, shunt);
  const about = { position, conductor };
  // P_ii = ln(2h/r): minus one per unit of ln r.
  const rows: SlopeRow[] = [
    {
      ...about,
      input: 'diameter',
      unit: 'relative',
      values: selfRow(weight, slope.byLogDiameter, -1, shunt),
    },
  ];
  if (conductor.model === 'handbook') {
    rows.push({
      ...about,
      input: 'gmr',
      unit: 'relative',
      values: selfRow(weight, slope.byLogGmr, 0, shunt),
    });
  }
  if (group.ground) {
    rows.push({ ...about, input: 'ground-wire-resistance', unit: 'relative', values: resistance });
  } else {
    rows.push({ ...about, input: 'ac-resistance', unit: 'relative', values: resistance });
    rows.push({
      ...about,
      input: 'temperature',
      unit: 'K',
      values: scaled(resistance, slope.logResistancePerK),
    });
  }
  return rows;
}

/**
 * Solves a section and gives the slopes of its sequence values with respect to every input, analytically: one
 * back-substitution a pattern and one pass over the wire pairs.
 *
 * @param s the section
 * @param frequencyHz 0.1 Hz to 1 MHz
 * @returns constants and rows, or the typed failure
 */
export function solveSlopes(s: OverheadSection, frequencyHz: number): SolvedSlopes | Failure {
  const w = solvePhases(s, frequencyHz);
  if ('ok' in w) return w;
  const omega = 2 * Math.PI * frequencyHz;
  const constants = readSequence(w, frequencyHz);
  slopes.fill(s, w, frequencyHz);
  const length = slopes.length;
  const height = slopes.height.slice(0, length);
  const rows: SlopeRow[] = [
    { input: 'height', unit: 'm', values: height },
    { input: 'sag', unit: 'm', values: scaled(height, -SAG_SHARE) },
    { input: 'earth-resistivity', unit: 'relative', values: slopes.logResistivity.slice(0, length) },
  ];
  s.positions.forEach((_, position) => {
    const values = slopes.offset.slice(position * length, (position + 1) * length);
    rows.push({ input: 'offset', unit: 'm', position, values });
  });
  for (const group of groupConductors(s, w)) rows.push(...conductorRows(group, omega));
  return { constants, rows };
}
