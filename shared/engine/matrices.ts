import { rowStart } from '../numerics/packed';
import { succeed } from './failures';
import { solvePhases, susceptanceFactor } from './section';
import type { OverheadSection, Pair, Result, SectionMatrices, Unbalance } from './types';

/** Full matrix as rows of [re, im] from one triangle. */
function unpack(re: Float64Array, im: Float64Array | null, n: number, factor: number): Pair[][] {
  return Array.from({ length: n }, (_, i) =>
    Array.from({ length: n }, (__, j): Pair => {
      const at = i >= j ? rowStart(i) + j : rowStart(j) + i;
      return [factor * (re[at] as number), im ? factor * (im[at] as number) : 0];
    }),
  );
}

const A_RE = -0.5;
const A_IM = Math.sqrt(3) / 2;
/** Powers of a = e^(j120°) by exponent mod 3. */
const POWERS: readonly Pair[] = [
  [1, 0],
  [A_RE, A_IM],
  [A_RE, -A_IM],
];
/** Row s of T^(−1) holds the powers for 0, +, −: V0 = ⅓(Va + Vb + Vc), V+ = ⅓(Va + aVb + a²Vc), V− = ⅓(Va + a²Vb + aVc). */
const EXPONENT = [
  [0, 0, 0],
  [0, 1, 2],
  [0, 2, 1],
] as const;

/**
 * Symmetrical components T⁻¹·M·T, circuit by circuit (0, +, − in this order).
 *
 * @param m phase matrix of order 3 × circuits
 */
export function toSequence(m: readonly (readonly Pair[])[]): Pair[][] {
  const n = m.length;
  return Array.from({ length: n }, (_, row) =>
    Array.from({ length: n }, (__, column): Pair => {
      let re = 0;
      let im = 0;
      for (let i = 0; i < 3; i++) {
        for (let k = 0; k < 3; k++) {
          const entry = m[row - (row % 3) + i]?.[column - (column % 3) + k] ?? [0, 0];
          const left = EXPONENT[(row % 3) as 0 | 1 | 2][i as 0 | 1 | 2];
          // T is the inverse without the third and with conjugate powers.
          const right = EXPONENT[(column % 3) as 0 | 1 | 2][k as 0 | 1 | 2];
          const [pr, pi] = POWERS[(left + 3 - right) % 3] as Pair;
          re += (entry[0] * pr - entry[1] * pi) / 3;
          im += (entry[0] * pi + entry[1] * pr) / 3;
        }
      }
      return [re, im];
    }),
  );
}

/** |Z21/Z11| and |Z01/Z11| within each circuit. */
function unbalanceOf(sequence: Pair[][]): Unbalance[] {
  const modulus = (row: number, column: number): number => {
    const [re, im] = sequence[row]?.[column] ?? [0, 0];
    return Math.sqrt(re * re + im * im);
  };
  const circuits = sequence.length / 3;
  return Array.from({ length: circuits }, (_, c) => {
    const self = modulus(3 * c + 1, 3 * c + 1);
    return { negative: modulus(3 * c + 2, 3 * c + 1) / self, zero: modulus(3 * c, 3 * c + 1) / self };
  });
}

/**
 * Full phase and sequence matrices of a section with bundles joined and ground wires taken out.
 *
 * @param s the section
 * @param frequencyHz 0.1 Hz to 1 MHz
 * @returns Ω/km and µS/km, rows circuit 1 a b c, circuit 2 a b c …; sequence rows 0 + − a circuit; the unbalance of
 * each circuit when it is not transposed; or the typed failure
 */
export function sectionMatrices(s: OverheadSection, frequencyHz: number): Result<SectionMatrices> {
  const w = solvePhases(s, frequencyHz);
  if ('ok' in w) return w;
  const z = unpack(w.zr, w.zi, w.phases, 1);
  const b = unpack(w.p, null, w.phases, susceptanceFactor(2 * Math.PI * frequencyHz));
  const sequence = toSequence(z);
  return succeed({
    phaseImpedanceOhmPerKm: z,
    phaseSusceptanceMicrosiemensPerKm: b.map((row) => row.map(([re]) => re)),
    sequenceImpedanceOhmPerKm: sequence,
    sequenceSusceptanceMicrosiemensPerKm: toSequence(b),
    unbalance: unbalanceOf(sequence),
  });
}
