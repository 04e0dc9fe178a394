import { fail, inSection, succeed } from './failures';
import { solveSection } from './section';
import { cascade, equivalentPi, THROUGH, uniformTwoPort } from './two-port';
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

/** One section, of either kind; `ratio` is the frequency asked for ÷ the line's own. */
function solveAny(s: LineSection, frequencyHz: number, ratio: number): Result<SectionConstants> {
  if (s === null || typeof s !== 'object') return fail('empty-section', {}, 'there is no section');
  return s.kind === 'cable' ? solveCable(s, ratio) : solveSection(s, frequencyHz);
}

/** Six zeros to sum into. */
function zeroConstants(): SequenceConstants {
  return { r1: 0, x1: 0, b1: 0, r0: 0, x0: 0, b0: 0 };
}

/** Adds a section's values, weighted by its share of the length, to those of the line. */
function accumulate(sum: SequenceConstants, values: SequenceConstants, weight: number): void {
  sum.r1 += values.r1 * weight;
  sum.x1 += values.x1 * weight;
  sum.b1 += values.b1 * weight;
  sum.r0 += values.r0 * weight;
  sum.x0 += values.x0 * weight;
  sum.b0 += values.b0 * weight;
}

/** Zero mutuals of all pairs of circuits, in the order in which sections list theirs: (1,2), (1,3) … (2,3) … */
function emptyMutuals(count: number): Mutual[] {
  const mutual: Mutual[] = [];
  for (let a = 1; a <= count; a++) {
    for (let b = a + 1; b <= count; b++) mutual.push({ circuits: [a, b], r0m: 0, x0m: 0, b0m: 0 });
  }
  return mutual;
}

/** Length-weighted means; a cable has no coupling between its circuits that anybody declared, it counts as zero. */
function weightedMeans(l: LineInput, parts: readonly SectionConstants[], lengthKm: number): SectionConstants {
  const count = parts[0]?.circuits.length ?? 0;
  const circuits: SequenceConstants[] = [];
  for (let c = 0; c < count; c++) circuits.push(zeroConstants());
  const mutual = emptyMutuals(count);
  for (let s = 0; s < parts.length; s++) {
    const part = parts[s] as SectionConstants;
    // A line of one section keeps its section's digits: no division by its own length.
    const weight = parts.length === 1 ? 1 : (l.sections[s] as LineSection).lengthKm / lengthKm;
    for (let c = 0; c < count; c++) {
      accumulate(circuits[c] as SequenceConstants, part.circuits[c] as SequenceConstants, weight);
    }
    for (let m = 0; m < part.mutual.length; m++) {
      const sum = mutual[m] as Mutual;
      const values = part.mutual[m] as Mutual;
      sum.r0m += values.r0m * weight;
      sum.x0m += values.x0m * weight;
      sum.b0m += values.b0m * weight;
    }
  }
  return { circuits, mutual };
}

/** Equivalent pi of one circuit, both sequences cascaded over the sections; b of both legs together. */
function circuitPi(l: LineInput, parts: readonly SectionConstants[], circuit: number): PiTotals {
  let one: TwoPort = THROUGH;
  let zero: TwoPort = THROUGH;
  for (let s = 0; s < parts.length; s++) {
    const v = (parts[s] as SectionConstants).circuits[circuit] as SequenceConstants;
    const length = (l.sections[s] as LineSection).lengthKm;
    // b comes in µS; half of the line's charging sits at either end only in the pi, the two-port holds it distributed.
    const portOne = uniformTwoPort([v.r1 * length, v.x1 * length], [0, v.b1 * length * 1e-6]);
    const portZero = uniformTwoPort([v.r0 * length, v.x0 * length], [0, v.b0 * length * 1e-6]);
    one = s === 0 ? portOne : cascade(one, portOne);
    zero = s === 0 ? portZero : cascade(zero, portZero);
  }
  const pi = equivalentPi(one);
  const pi0 = equivalentPi(zero);
  return {
    r: pi.z[0],
    x: pi.z[1],
    b: (pi.yFrom[1] + pi.yTo[1]) * 1e6,
    r0: pi0.z[0],
    x0: pi0.z[1],
    b0: (pi0.yFrom[1] + pi0.yTo[1]) * 1e6,
  };
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
  if (l === null || typeof l !== 'object') return fail('empty-line', {}, 'there is no line');
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
  // Sections in series carry the same circuits; a stretch with fewer is a line of its own.
  const odd = parts.length === 1 ? -1 : parts.findIndex((part) => part.circuits.length !== count);
  if (odd >= 0) {
    const seen = parts[odd]?.circuits.length ?? 0;
    return fail(
      'circuit-mismatch',
      { section: odd },
      `the section has ${seen} circuits, the first one ${count}`,
    );
  }
  let lengthKm = 0;
  for (const s of l.sections) lengthKm += s.lengthKm;
  const mean = weightedMeans(l, parts, lengthKm);
  const equivalent: PiTotals[] = [];
  const nominal: PiTotals[] = [];
  for (let c = 0; c < count; c++) {
    equivalent.push(circuitPi(l, parts, c));
    nominal.push(nominalPi(mean.circuits[c] as SequenceConstants, lengthKm));
  }
  return succeed({ ...mean, lengthKm, equivalent, nominal });
}

/**
 * Constants of a whole line: sections in series, length-weighted means, exact equivalent pi and nominal totals.
 *
 * @param l sections in their order
 * @param frequencyHz 0.1 Hz to 1 MHz; the line's own when left out
 * @returns per circuit Ω/km and µS/km, totals in Ω and µS; or the typed failure with section and position
 */
export function solveLine(l: LineInput, frequencyHz: number = l?.frequencyHz): Result<LineConstants> {
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
