import { MAX_CIRCUITS } from './constants';
import { fail, inSection, succeed } from './failures';
import { checkLine, combineSections, solveCable } from './line';
import { visitSlopes } from './section-slopes';
import type { InputUncertainties, LineUncertainty, Sensitivity, UncertainInput } from './sensitivity-types';
import { checkUncertainties, SpreadSum } from './spread-sum';
import {
  SEQUENCE_KEYS,
  type CableSection,
  type ConductorData,
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

/** Entries of the slope vectors for a number of circuits: r, x, b of two sequences a circuit and of each mutual. */
function vectorLength(circuits: number): number {
  return 3 * (2 * circuits + (circuits * (circuits - 1)) / 2);
}

/** Circuits of a section as it is written, checked or not: only to make room. */
function countCircuits(s: LineSection): number {
  if (s.kind === 'cable') return Array.isArray(s.perLength) ? s.perLength.length : 0;
  let most = 0;
  if (Array.isArray(s.positions)) {
    for (const p of s.positions) if (p?.kind === 'phase' && p.circuit > most) most = p.circuit;
  }
  return Number.isFinite(most) ? Math.ceil(most) : 0;
}

/** Solves an overhead section and adds its inputs' moves to the line's sum. */
function addOverhead(
  sum: SpreadSum,
  s: OverheadSection,
  frequencyHz: number,
  section: number,
  weight: number,
  alone: boolean,
): SectionConstants | Failure {
  return visitSlopes(s, frequencyHz, (input, values, start, factor, position, conductor) => {
    // Over several sections a conductor's data move together; alone, its moves can be squared at once.
    if (conductor && !alone) sum.addShared(input, values, factor * weight, section, position, conductor);
    else sum.add(input, values, start, factor * weight, section, position);
  });
}

/** A cable has values but no slopes. */
function solveCablePart(s: CableSection): SectionConstants | Failure {
  const cable = solveCable(s, 1);
  return cable.ok ? cable.value : cable;
}

/** Spreads in the order of the slope vectors: six a circuit, then three a pair of circuits. */
function readSpreads(constants: LineConstants, sum: SpreadSum): LineUncertainty {
  const circuits: LineUncertainty['circuits'] = [];
  const mutual: LineUncertainty['mutual'] = [];
  let e = 0;
  for (const v of constants.circuits) {
    circuits.push({
      r1: sum.spread(v.r1, e),
      x1: sum.spread(v.x1, e + 1),
      b1: sum.spread(v.b1, e + 2),
      r0: sum.spread(v.r0, e + 3),
      x0: sum.spread(v.x0, e + 4),
      b0: sum.spread(v.b0, e + 5),
    });
    e += 6;
  }
  for (const m of constants.mutual) {
    mutual.push({
      circuits: m.circuits,
      r0m: sum.spread(m.r0m, e),
      x0m: sum.spread(m.x0m, e + 1),
      b0m: sum.spread(m.b0m, e + 2),
    });
    e += 3;
  }
  return { constants, circuits, mutual };
}

/**
 * Plausible range of every per-length value of a line at its own frequency: how far it moves when each input moves
 * within its uncertainty, to first order and combined in quadrature. Holds the line's constants too, so that one call
 * gives both.
 *
 * Heights and sags are one shift a section, each horizontal offset moves alone, a conductor's data move together
 * wherever the line uses the same data (phase conductors apart from ground wires), the earth of each section moves
 * alone in ln ρ. Cables enter as declared and without uncertainty.
 *
 * @param l the line
 * @param inputs how far each input may be off
 * @returns constants and spreads; or the typed failure
 */
export function uncertainty(l: LineInput, inputs: InputUncertainties): Result<LineUncertainty> {
  const fault = checkLine(l, l?.frequencyHz) ?? checkUncertainties(inputs);
  if (fault) return fault;
  const alone = l.sections.length === 1;
  let lengthKm = 0;
  let circuits = 0;
  for (const s of l.sections) {
    if (s === null || typeof s !== 'object') return fail('empty-section', {}, 'there is no section');
    lengthKm += s.lengthKm;
    // Sections that differ in circuits are refused below; until then the widest one's room serves all.
    circuits = Math.max(circuits, countCircuits(s));
  }
  const sum = new SpreadSum(vectorLength(Math.min(circuits, MAX_CIRCUITS)), inputs);
  const parts: SectionConstants[] = [];
  for (let i = 0; i < l.sections.length; i++) {
    const s = l.sections[i] as LineSection;
    const weight = alone ? 1 : s.lengthKm / lengthKm;
    const part =
      s.kind === 'cable' ? solveCablePart(s) : addOverhead(sum, s, l.frequencyHz, i, weight, alone);
    if ('ok' in part) return inSection(part, i);
    parts.push(part);
  }
  const combined = combineSections(l, parts);
  if (!combined.ok) return combined;
  sum.finish();
  return succeed(readSpreads(combined.value, sum));
}

/** Unit of each input's slope; `relative` ones are per unit of the natural logarithm. */
const UNITS: Record<UncertainInput, Sensitivity['unit']> = {
  height: 'm',
  sag: 'm',
  offset: 'm',
  diameter: 'relative',
  gmr: 'relative',
  'ac-resistance': 'relative',
  temperature: 'K',
  'ground-wire-resistance': 'relative',
  'earth-resistivity': 'relative',
};

/**
 * First-order sensitivities of a section's values to every input.
 *
 * @param s the section
 * @param frequencyHz 0.1 Hz to 1 MHz
 * @returns one entry an input; or the typed failure
 */
export function sensitivities(s: OverheadSection, frequencyHz: number): Result<Sensitivity[]> {
  const rows: Sensitivity[] = [];
  const count = countCircuits(s);
  const solved = visitSlopes(s, frequencyHz, (input, values, start, factor, position, conductor) => {
    const vector = values.slice(start, start + vectorLength(count)).map((v) => v * factor);
    rows.push(toSensitivity(input, vector, count, position, conductor));
  });
  return 'ok' in solved ? solved : succeed(rows);
}

/** A slope vector with its names back on. */
function toSensitivity(
  input: UncertainInput,
  vector: Float64Array,
  count: number,
  position: number,
  conductor: ConductorData | null,
): Sensitivity {
  const at = (e: number): number => vector[e] ?? 0;
  const circuits = Array.from({ length: count }, (_, c) => {
    const entries = SEQUENCE_KEYS.map((key, k) => [key, at(6 * c + k)]);
    return Object.fromEntries(entries) as SequenceConstants;
  });
  const mutual = Array.from({ length: (count * (count - 1)) / 2 }, (_, k) => {
    const first = 6 * count + 3 * k;
    return { r0m: at(first), x0m: at(first + 1), b0m: at(first + 2) };
  });
  const where: Where = position < 0 ? {} : { position };
  return { input, unit: UNITS[input], where, circuits, mutual, ...(conductor && { conductor }) };
}
