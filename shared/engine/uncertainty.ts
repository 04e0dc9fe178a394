import { sameConductor } from './conductor-slopes';
import { inSection, succeed } from './failures';
import { checkLine, combineSections, solveCable } from './line';
import { solveSlopes, type SlopeRow } from './section-slopes';
import type {
  InputUncertainties,
  LineUncertainty,
  Sensitivity,
  Spread,
  UncertainInput,
} from './sensitivity-types';
import {
  SEQUENCE_KEYS,
  type Failure,
  type LineConstants,
  type LineInput,
  type LineSection,
  type OverheadSection,
  type Result,
  type SectionConstants,
  type SequenceConstants,
  type Where,
} from './types';

/** A row of the whole line: slopes weighted by the sections' lengths. */
interface LineRow extends SlopeRow {
  section: number;
}

/** Step of an input within its uncertainty, in the unit of its slope. */
function stepOf(input: UncertainInput, u: InputUncertainties): number {
  switch (input) {
    case 'height':
      return u.heightM;
    case 'sag':
      return u.sagM;
    case 'offset':
      return u.offsetM;
    case 'diameter':
      return u.diameterRelative;
    case 'gmr':
      return u.gmrRelative;
    case 'ac-resistance':
      return u.acResistanceRelative;
    case 'temperature':
      return u.temperatureK;
    case 'ground-wire-resistance':
      return u.groundWireResistanceRelative;
    case 'earth-resistivity':
      return Math.log(u.earthResistivityFactor);
  }
}

/** Inputs of a conductor move together wherever the line uses it; all else belongs to its section. */
function sameInput(a: LineRow, b: LineRow): boolean {
  return (
    a.input === b.input &&
    a.conductor !== undefined &&
    b.conductor !== undefined &&
    sameConductor(a.conductor, b.conductor)
  );
}

function addWeighted(rows: LineRow[], part: readonly SlopeRow[], section: number, weight: number): void {
  for (const row of part) {
    const candidate: LineRow = { ...row, section };
    const known = section > 0 ? rows.find((r) => sameInput(r, candidate)) : undefined;
    if (known) {
      const { values } = known;
      for (let q = 0; q < values.length; q++)
        values[q] = (values[q] as number) + weight * (row.values[q] as number);
      continue;
    }
    if (weight !== 1)
      for (let q = 0; q < row.values.length; q++) row.values[q] = weight * (row.values[q] as number);
    rows.push(candidate);
  }
}

/** Half range of every entry of the slope vectors, and the row that gives most of it (−1 for none). */
function combine(
  rows: readonly LineRow[],
  u: InputUncertainties,
  length: number,
): { half: Float64Array; top: Int32Array } {
  const half = new Float64Array(length);
  const most = new Float64Array(length);
  const top = new Int32Array(length).fill(-1);
  rows.forEach((row, index) => {
    const step = stepOf(row.input, u);
    for (let q = 0; q < length; q++) {
      const move = Math.abs(step * (row.values[q] as number));
      half[q] = (half[q] as number) + move * move;
      if (move > (most[q] as number)) {
        most[q] = move;
        top[q] = index;
      }
    }
  });
  for (let q = 0; q < length; q++) half[q] = Math.sqrt(half[q] as number);
  return { half, top };
}

function whereOf(row: LineRow): Where {
  return row.position === undefined
    ? { section: row.section }
    : { section: row.section, position: row.position };
}

/** Solves all sections with slopes; cables enter as declared and without uncertainty. */
function solveRows(l: LineInput): { parts: SectionConstants[]; rows: LineRow[] } | Failure {
  const lengthKm = l.sections.reduce((sum, s) => sum + s.lengthKm, 0);
  const parts: SectionConstants[] = [];
  const rows: LineRow[] = [];
  for (let i = 0; i < l.sections.length; i++) {
    const section = l.sections[i] as LineSection;
    if (section.kind === 'cable') {
      const cable = solveCable(section, 1);
      if (!cable.ok) return inSection(cable, i);
      parts.push(cable.value);
      continue;
    }
    const solved = solveSlopes(section, l.frequencyHz);
    if ('ok' in solved) return inSection(solved, i);
    parts.push(solved.constants);
    addWeighted(rows, solved.rows, i, l.sections.length === 1 ? 1 : section.lengthKm / lengthKm);
  }
  return { parts, rows };
}

function spreads(constants: LineConstants, rows: readonly LineRow[], u: InputUncertainties): LineUncertainty {
  const count = constants.circuits.length;
  const { half, top } = combine(rows, u, 3 * (2 * count + constants.mutual.length));
  const spread = (value: number, entry: number): Spread => {
    const halfRange = half[entry] ?? 0;
    const row = rows[top[entry] ?? -1];
    return {
      value,
      halfRange,
      low: value - halfRange,
      high: value + halfRange,
      dominant: row?.input ?? null,
      where: row ? whereOf(row) : {},
    };
  };
  return {
    constants,
    circuits: constants.circuits.map((v, c) => ({
      r1: spread(v.r1, 6 * c),
      x1: spread(v.x1, 6 * c + 1),
      b1: spread(v.b1, 6 * c + 2),
      r0: spread(v.r0, 6 * c + 3),
      x0: spread(v.x0, 6 * c + 4),
      b0: spread(v.b0, 6 * c + 5),
    })),
    mutual: constants.mutual.map((m, k) => ({
      circuits: m.circuits,
      r0m: spread(m.r0m, 6 * count + 3 * k),
      x0m: spread(m.x0m, 6 * count + 3 * k + 1),
      b0m: spread(m.b0m, 6 * count + 3 * k + 2),
    })),
  };
}

/**
 * Plausible range of every per-length value of a line at its own frequency: how far it moves when each input moves
 * within its uncertainty, to first order and combined in quadrature. Holds the line's constants too, so that one call
 * gives both.
 *
 * Heights and sags are one shift a section, each horizontal offset moves alone, a conductor's data move together
 * wherever the line uses the same data, the earth of each section moves alone in ln ρ.
 *
 * @param l the line
 * @param inputs how far each input may be off
 * @returns constants and spreads; or the typed failure
 */
export function uncertainty(l: LineInput, inputs: InputUncertainties): Result<LineUncertainty> {
  const fault = checkLine(l, l.frequencyHz);
  if (fault) return fault;
  const solved = solveRows(l);
  if ('ok' in solved) return solved;
  const combined = combineSections(l, solved.parts);
  return combined.ok ? succeed(spreads(combined.value, solved.rows, inputs)) : combined;
}

/**
 * First-order sensitivities of a section's values to every input.
 *
 * @param s the section
 * @param frequencyHz 0.1 Hz to 1 MHz
 * @returns one entry an input; or the typed failure
 */
export function sensitivities(s: OverheadSection, frequencyHz: number): Result<Sensitivity[]> {
  const solved = solveSlopes(s, frequencyHz);
  if ('ok' in solved) return solved;
  const count = solved.constants.circuits.length;
  return succeed(solved.rows.map((row) => toSensitivity(row, count)));
}

function toSensitivity(row: SlopeRow, count: number): Sensitivity {
  const at = (q: number): number => row.values[q] ?? 0;
  const circuits = Array.from({ length: count }, (_, c) => {
    const entries = SEQUENCE_KEYS.map((key, k) => [key, at(6 * c + k)]);
    return Object.fromEntries(entries) as SequenceConstants;
  });
  const mutual = Array.from({ length: (count * (count - 1)) / 2 }, (_, k) => {
    const first = 6 * count + 3 * k;
    return { r0m: at(first), x0m: at(first + 1), b0m: at(first + 2) };
  });
  const where: Where = row.position === undefined ? {} : { position: row.position };
  return {
    input: row.input,
    unit: row.unit,
    where,
    circuits,
    mutual,
    ...(row.conductor && { conductor: row.conductor }),
  };
}
