import { fail, inSection, succeed } from './failures';
import { solveSection } from './section';
import { cascade, equivalentPi, THROUGH, uniformTwoPort } from './two-port';
import type { Complex } from '../numerics/complex';
import type { TwoPort } from './two-port';
import {
  SEQUENCE_KEYS,
  type CableSection,
  type Failure,
  type LineConstants,
  type LineInput,
  type LineSection,
  type Mutual,
  type PiTotals,
  type Result,
  type SectionConstants,
  type SequenceConstants,
} from './types';
import { checkFrequency } from './validate';

/** A cable's values as its maker declares them, scaled in frequency (x and b in proportion, r kept) when another one is asked for. */
export function solveCable(s: CableSection, ratio: number): Result<SectionConstants> {
  if (!(s.lengthKm > 0) || !Number.isFinite(s.lengthKm)) {
    return fail(
      'out-of-range',
      { field: 'lengthKm' },
      `lengthKm is ${s.lengthKm}, wanted is a length above 0`,
    );
  }
  if (!Array.isArray(s.perLength) || s.perLength.length === 0) {
    return fail('empty-section', { field: 'perLength' }, 'the cable section has no values');
  }
  for (const values of s.perLength) {
    for (const key of SEQUENCE_KEYS) {
      if (!Number.isFinite(values[key])) {
        return fail(
          'non-finite',
          { field: key },
          `${key} is ${String(values[key])}, a finite number is wanted`,
        );
      }
    }
  }
  const circuits = s.perLength.map((v) => ({
    r1: v.r1,
    x1: v.x1 * ratio,
    b1: v.b1 * ratio,
    r0: v.r0,
    x0: v.x0 * ratio,
    b0: v.b0 * ratio,
  }));
  return succeed({ circuits, mutual: [] });
}

function solveAny(s: LineSection, frequencyHz: number, ratio: number): Result<SectionConstants> {
  return s.kind === 'cable' ? solveCable(s, ratio) : solveSection(s, frequencyHz);
}

/** Adds a section's values to the sums, weighted by its length. */
function accumulate(sum: SequenceConstants, values: SequenceConstants, weight: number): void {
  for (const key of SEQUENCE_KEYS) sum[key] += values[key] * weight;
}

function zeroConstants(): SequenceConstants {
  return { r1: 0, x1: 0, b1: 0, r0: 0, x0: 0, b0: 0 };
}

/** Length-weighted means; a cable has no coupling between its circuits that anybody declared, it counts as zero. */
function weightedMeans(parts: readonly SectionConstants[], weights: readonly number[]): SectionConstants {
  const count = parts[0]?.circuits.length ?? 0;
  const circuits = Array.from({ length: count }, zeroConstants);
  const mutual: Mutual[] = [];
  for (let a = 1; a <= count; a++) {
    for (let b = a + 1; b <= count; b++) mutual.push({ circuits: [a, b], r0m: 0, x0m: 0, b0m: 0 });
  }
  parts.forEach((part, s) => {
    const weight = weights[s] ?? 0;
    part.circuits.forEach((values, c) => accumulate(circuits[c] ?? zeroConstants(), values, weight));
    part.mutual.forEach((values, m) => {
      const sum = mutual[m];
      if (!sum) return;
      sum.r0m += values.r0m * weight;
      sum.x0m += values.x0m * weight;
      sum.b0m += values.b0m * weight;
    });
  });
  return { circuits, mutual };
}

/** Equivalent pi of one sequence: [r, x, b] in Ω and µS, b of both legs together. */
function sequencePi(
  parts: readonly SequenceConstants[],
  lengths: readonly number[],
  keys: readonly ['r1' | 'r0', 'x1' | 'x0', 'b1' | 'b0'],
): [number, number, number] {
  let port: TwoPort = THROUGH;
  parts.forEach((v, s) => {
    const length = lengths[s] ?? 0;
    const z: Complex = [v[keys[0]] * length, v[keys[1]] * length];
    port = cascade(port, uniformTwoPort(z, [0, v[keys[2]] * length * 1e-6]));
  });
  const pi = equivalentPi(port);
  return [pi.z[0], pi.z[1], (pi.yFrom[1] + pi.yTo[1]) * 1e6];
}

function circuitPi(parts: readonly SequenceConstants[], lengths: readonly number[]): PiTotals {
  const [r, x, b] = sequencePi(parts, lengths, ['r1', 'x1', 'b1']);
  const [r0, x0, b0] = sequencePi(parts, lengths, ['r0', 'x0', 'b0']);
  return { r, x, b, r0, x0, b0 };
}

/** Plain sums of length × per-length value. */
function nominalPi(mean: SequenceConstants, lengthKm: number): PiTotals {
  return {
    r: mean.r1 * lengthKm,
    x: mean.x1 * lengthKm,
    b: mean.b1 * lengthKm,
    r0: mean.r0 * lengthKm,
    x0: mean.x0 * lengthKm,
    b0: mean.b0 * lengthKm,
  };
}

/**
 * Checks what concerns a line as a whole: frequencies and that there is a section.
 *
 * @returns the failure, or null
 */
export function checkLine(l: LineInput, frequencyHz: number): Failure | null {
  const fault = checkFrequency(frequencyHz) ?? checkFrequency(l.frequencyHz);
  if (fault) return fault;
  if (Array.isArray(l.sections) && l.sections.length > 0) return null;
  return fail('empty-line', {}, 'the line has no section');
}

/**
 * Puts solved sections in series: length-weighted means, equivalent pi, nominal totals.
 *
 * @param l the line
 * @param parts its sections' constants in the same order
 * @returns the line's constants, or the failure when the sections differ in their number of circuits
 */
export function combineSections(l: LineInput, parts: readonly SectionConstants[]): Result<LineConstants> {
  const count = parts[0]?.circuits.length ?? 0;
  const odd = parts.findIndex((part) => part.circuits.length !== count);
  if (odd >= 0) {
    const seen = parts[odd]?.circuits.length ?? 0;
    return fail(
      'circuit-mismatch',
      { section: odd },
      `the section has ${seen} circuits, the first one ${count}`,
    );
  }
  const lengths = l.sections.map((s) => s.lengthKm);
  const lengthKm = lengths.reduce((sum, length) => sum + length, 0);
  const mean = weightedMeans(
    parts,
    lengths.map((length) => length / lengthKm),
  );
  const circuitParts = (c: number): SequenceConstants[] => parts.map((p) => p.circuits[c] ?? zeroConstants());
  return succeed({
    ...mean,
    lengthKm,
    equivalent: mean.circuits.map((_, c) => circuitPi(circuitParts(c), lengths)),
    nominal: mean.circuits.map((values) => nominalPi(values, lengthKm)),
  });
}

/**
 * Constants of a whole line: sections in series, length-weighted means, exact equivalent pi and nominal totals.
 *
 * @param l sections in their order
 * @param frequencyHz 0.1 Hz to 1 MHz; the line's own when left out
 * @returns per circuit Ω/km and µS/km, totals in Ω and µS; or the typed failure with section and position
 */
export function solveLine(l: LineInput, frequencyHz: number = l.frequencyHz): Result<LineConstants> {
  const fault = checkLine(l, frequencyHz);
  if (fault) return fault;
  const parts: SectionConstants[] = [];
  for (let i = 0; i < l.sections.length; i++) {
    const result = solveAny(l.sections[i] as LineSection, frequencyHz, frequencyHz / l.frequencyHz);
    if (!result.ok) return inSection(result, i);
    parts.push(result.value);
  }
  return combineSections(l, parts);
}
