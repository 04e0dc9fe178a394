import type { NormalisedOverhead } from '../../../filing/types';
import { digitsApart, withUnit } from '../../words';
import type { FindingDraft, LineRule } from '../rule';
import { drawnSections, phasesOf, positionPointer, positionWords } from './places';
import { dimensionsAt } from './voltage-table';
import type { VoltageDimensions } from './voltage-table';

/** Phase spacing implausible for the voltage. */
export const phaseSpacing: LineRule = {
  code: 'drawing.phase-spacing',
  family: 'drawing',
  grades: ['must-answer', 'explain'],
  parameter: null,
  needs: 'positions; 60 to 880 kV',
  sentence: 'Phases hang neither closer nor farther apart than the voltage makes plausible.',
  source: 'margins around NESC rule 235B (RUS bulletin 1724E-200); local code governs',
  on: 'line',
  apply: ({ line }) => {
    const dimensions = dimensionsAt(line.nominalVoltageKv);
    if (dimensions === null) return [];
    return drawnSections(line).flatMap(({ section, index }) =>
      weighSection(section, dimensions, line.nominalVoltageKv).map((draft) => ({ ...draft, section: index })),
    );
  },
};

interface Pair {
  /** At the structure or at mid-span, whichever is less. */
  spacingM: number;
  /** At the structure. */
  atStructureM: number;
  one: number;
  two: number;
}

function weighSection(section: NormalisedOverhead, limits: VoltageDimensions, kv: number): FindingDraft[] {
  const all = pairs(section, null).sort((a, b) => a.spacingM - b.spacingM)[0];
  // Phases at one place have a finding of their own.
  if (all === undefined || all.spacingM === 0) return [];
  const [low, high] = limits.plainSpacingM;
  const at = withUnit(kv, 'kV');
  if (all.spacingM < low) {
    // Sags that differ are drawn for one span; only the structure itself is certain.
    const isLeast = all.atStructureM < limits.leastSpacingM;
    const limit = isLeast ? limits.leastSpacingM : low;
    return [
      draft(
        section,
        all,
        isLeast,
        limit,
        `closer than the ${withUnit(limit, 'm')} that ${at} makes plausible`,
      ),
    ];
  }
  const circuits = new Set(phasesOf(section).map(({ position }) => position.circuit));
  return [...circuits].flatMap((circuit) => {
    const nearest = pairs(section, circuit).sort((a, b) => a.spacingM - b.spacingM)[0];
    if (nearest === undefined || nearest.spacingM <= high) return [];
    return [
      draft(
        section,
        nearest,
        false,
        high,
        `farther than the ${withUnit(high, 'm')} that is usual up to ${at}`,
      ),
    ];
  });
}

function draft(
  section: NormalisedOverhead,
  pair: Pair,
  isMust: boolean,
  limitM: number,
  words: string,
): FindingDraft {
  const spacing = withUnit(pair.spacingM, 'm', digitsApart(pair.spacingM, limitM));
  return {
    grade: isMust ? 'must-answer' : 'explain',
    position: pair.two,
    where: positionPointer(section, pair.two),
    message: `The nearest phases, ${positionWords(section, pair.one)} and ${positionWords(section, pair.two)}, hang ${spacing} apart, ${words}.`,
  };
}

/** Distances between phase positions, at the structure or at mid-span, whichever is less. */
function pairs(section: NormalisedOverhead, circuit: number | null): Pair[] {
  const phases = phasesOf(section).filter(({ position }) => circuit === null || position.circuit === circuit);
  return phases.flatMap((one, at) =>
    phases.slice(at + 1).map((two) => {
      const acrossM = one.position.horizontalM - two.position.horizontalM;
      const upM = one.position.attachmentHeightM - two.position.attachmentHeightM;
      const midM = upM - one.position.sagM + two.position.sagM;
      const atStructureM = Math.hypot(acrossM, upM);
      const spacingM = Math.min(atStructureM, Math.hypot(acrossM, midM));
      return { spacingM, atStructureM, one: one.index, two: two.index };
    }),
  );
}
