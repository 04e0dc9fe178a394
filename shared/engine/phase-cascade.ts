import {
  dense,
  denseExpm1,
  denseAdd,
  denseFrom,
  denseMultiply,
  denseSolve,
  type DenseMatrix,
} from '../numerics/dense';
import { fail, inSection, succeed } from './failures';
import { checkLine, solveCable } from './line';
import { sectionMatrices } from './matrices';
import type { Failure, LineInput, LineSection, Pair, Result, SequenceConstants } from './types';

/** The whole line in phase quantities: three rows a circuit, so six for a double circuit. */
export interface PhaseCascade {
  /** Sending-end voltages and currents from the receiving end's: V_s = A·V_r + B·I_r, I_s = C·V_r + D·I_r. */
  a: Pair[][];
  /** Ω */
  b: Pair[][];
  /** S */
  c: Pair[][];
  d: Pair[][];
  /** Equivalent pi: series impedance in Ω, shunt admittances in S at the sending and the receiving end. */
  pi: { z: Pair[][]; yFrom: Pair[][]; yTo: Pair[][] };
}

/** Series impedance (Ω/km) and shunt admittance (S/km) of a section in phases. */
interface PhaseConstants {
  z: DenseMatrix;
  y: DenseMatrix;
}

/** A cable's circuits as balanced three-phase blocks without coupling: self (z0 + 2z1)/3, mutual (z0 − z1)/3. */
function balancedBlocks(circuits: readonly SequenceConstants[]): PhaseConstants {
  const n = 3 * circuits.length;
  const entry = (i: number, j: number, one: 'r1' | 'x1' | 'b1', zero: 'r0' | 'x0' | 'b0'): number => {
    const c = circuits[Math.floor(i / 3)];
    if (!c || Math.floor(i / 3) !== Math.floor(j / 3)) return 0;
    return i === j ? (c[zero] + 2 * c[one]) / 3 : (c[zero] - c[one]) / 3;
  };
  return {
    z: denseFrom(n, (i, j) => [entry(i, j, 'r1', 'r0'), entry(i, j, 'x1', 'x0')]),
    y: denseFrom(n, (i, j) => [0, entry(i, j, 'b1', 'b0') * 1e-6]),
  };
}

/** A section's matrices, its own for overhead ones, balanced blocks for cables. */
function phaseConstants(s: LineSection, frequencyHz: number, ratio: number): Result<PhaseConstants> {
  if (s === null || typeof s !== 'object') return fail('empty-section', {}, 'there is no section');
  if (s.kind === 'cable') {
    const cable = solveCable(s, ratio);
    return cable.ok ? succeed(balancedBlocks(cable.value.circuits)) : cable;
  }
  const m = sectionMatrices(s, frequencyHz);
  if (!m.ok) return m;
  const { phaseImpedanceOhmPerKm: z, phaseSusceptanceMicrosiemensPerKm: b } = m.value;
  return succeed({
    z: denseFrom(z.length, (i, j) => z[i]?.[j] ?? [0, 0]),
    y: denseFrom(b.length, (i, j) => [0, (b[i]?.[j] ?? 0) * 1e-6]),
  });
}

/** exp of [0 Zl; Yl 0] less the unit matrix: the section's exact two-port of double order. */
function sectionPort(c: PhaseConstants, lengthKm: number): DenseMatrix {
  const { n } = c.z;
  // d(V, I)/dx = −[0 Z; Y 0]·(V, I), walked from the receiving end: exp of the generator times the length.
  const generator = denseFrom(2 * n, (i, j) => {
    if (i < n === j < n) return [0, 0];
    const m = i < n ? c.z : c.y;
    const at = (i % n) * n + (j % n);
    return [lengthKm * (m.re[at] as number), lengthKm * (m.im[at] as number)];
  });
  return denseExpm1(generator);
}

/** One of the four blocks, with the unit matrix added back where asked. */
function block(port: DenseMatrix, row: number, column: number, unit: boolean): DenseMatrix {
  const n = port.n / 2;
  return denseFrom(n, (i, j) => {
    const at = (row * n + i) * port.n + column * n + j;
    return [(port.re[at] as number) + (unit && i === j ? 1 : 0), port.im[at] as number];
  });
}

/** The matrix as rows of [re, im]. */
function pairs(m: DenseMatrix): Pair[][] {
  return Array.from({ length: m.n }, (_, i) =>
    Array.from({ length: m.n }, (__, j): Pair => [m.re[i * m.n + j] as number, m.im[i * m.n + j] as number]),
  );
}

/** Runs through the sections and multiplies their two-ports, (1 + E)(1 + F) − 1 = E + F + EF. */
function cascadeSections(l: LineInput, frequencyHz: number): DenseMatrix | Failure {
  let port: DenseMatrix | null = null;
  for (let i = 0; i < l.sections.length; i++) {
    const section = l.sections[i] as LineSection;
    const constants = phaseConstants(section, frequencyHz, frequencyHz / l.frequencyHz);
    if (!constants.ok) return inSection(constants, i);
    const next = sectionPort(constants.value, section.lengthKm);
    if (port && port.n !== next.n) {
      return fail(
        'circuit-mismatch',
        { section: i },
        'the section has another number of circuits than the first one',
      );
    }
    port = port ? denseAdd(denseAdd(port, next), denseMultiply(port, next)) : next;
  }
  return port ?? dense(0);
}

/**
 * Cascades a line in phases, coupling of phases and circuits kept, untransposed as drawn: the six-phase form of a
 * double circuit. In phases the couplings between sequences and circuits are all there, which the per-sequence
 * two-ports of `solveLine` leave out.
 *
 * @param l the line
 * @param frequencyHz 0.1 Hz to 1 MHz; the line's own when left out
 * @returns A, B, C, D and the equivalent pi; or the typed failure
 */
export function phaseCascade(l: LineInput, frequencyHz: number = l?.frequencyHz): Result<PhaseCascade> {
  const fault = checkLine(l, frequencyHz);
  if (fault) return fault;
  const port = cascadeSections(l, frequencyHz);
  if ('ok' in port) return port;
  const z = block(port, 0, 1, false);
  // Legs from B·Y_to = A − 1 and Y_from·B = D − 1, the latter transposed (B is symmetric for reciprocal lines).
  const yTo = denseSolve(z, block(port, 0, 0, false));
  const d = block(port, 1, 1, false);
  const transposed = denseSolve(transpose(z), transpose(d));
  if (!yTo || !transposed)
    return fail('ill-conditioned', {}, 'the series impedance of the line is singular', Infinity);
  return succeed({
    a: pairs(block(port, 0, 0, true)),
    b: pairs(z),
    c: pairs(block(port, 1, 0, false)),
    d: pairs(block(port, 1, 1, true)),
    pi: { z: pairs(z), yFrom: pairs(transpose(transposed)), yTo: pairs(yTo) },
  });
}

/** The transpose. */
function transpose(m: DenseMatrix): DenseMatrix {
  return denseFrom(m.n, (i, j) => [m.re[j * m.n + i] as number, m.im[j * m.n + i] as number]);
}
