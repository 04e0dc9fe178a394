import type { OverheadSection } from '../../../engine/index';
import type { Outcome } from '../bench';
import { TIGHT } from '../problem';
import { fitOne, gridOf } from './fit-one';
import type { Candidate, Coordinate, Position } from './position-candidates';
import { candidatesOf, coordinateWords } from './position-candidates';
import { spacingOf } from './spacing';
import type { Variant, VariantContext } from './variant';
import { ENGINE_MODEL, overheadSections, sectionPointer } from './variant';

/** Room that the quick look leaves for ground wires, bundles and untransposed phases. */
const QUICK_LOOK = TIGHT + 0.015;

/** One coordinate of one position off, by every slip that people make with a coordinate. */
export function positionSlips(context: VariantContext): Variant[] {
  const parts = overheadSections(context).map((part) => ({
    ...part,
    candidates: candidatesOf(part.section),
  }));
  const count = parts.reduce((sum, { candidates }) => sum + candidates.length, 0);
  const price = -0.7 - Math.log(Math.max(2, count)) * 0.7;
  const single = parts.flatMap(({ section, index, candidates }) =>
    candidates.flatMap((candidate): Variant[] => {
      const changed = moved(section, candidate.index, candidate.field, candidate.value);
      if (!couldFit(context, section, changed)) return [];
      const outcome = context.bench.changed((_, at) => (at === index ? changed : null));
      return outcome === null
        ? []
        : [variantOf(context, index, candidate, outcome, price + candidate.prior, 0)];
    }),
  );
  return [...single, ...fromLowestArm(context)];
}

/** The value that one coordinate would need for the declared X1 to hold. */
export function fittedPositions(context: VariantContext): Variant[] {
  const parts = overheadSections(context);
  const coordinates = parts.reduce((sum, { section }) => sum + 2 * section.positions.length, 0);
  const price = -3 - Math.log(Math.max(2, coordinates));
  return parts.flatMap(({ section, index }) =>
    section.positions.flatMap((position, at): Variant[] => {
      if (position.kind !== 'phase') return [];
      const circuit = position.circuit - 1;
      return (['horizontalM', 'attachmentHeightM'] as const).flatMap((field) =>
        rootsOf(context, section, index, at, field, circuit).flatMap((value): Variant[] => {
          const changed = moved(section, at, field, value);
          const outcome = context.bench.changed((_, other) => (other === index ? changed : null));
          const candidate = candidateOf(position, at, field, value);
          return outcome === null ? [] : [variantOf(context, index, candidate, outcome, price, 1)];
        }),
      );
    }),
  );
}

function candidateOf(position: Position, index: number, field: Coordinate, value: number): Candidate {
  const rounded = Number(value.toPrecision(4));
  return {
    index,
    field,
    value: rounded,
    prior: 0,
    words: () => coordinateWords(position, index, field, rounded),
  };
}

function rootsOf(
  context: VariantContext,
  section: OverheadSection,
  index: number,
  at: number,
  field: Coordinate,
  circuit: number,
): number[] {
  const wanted = context.declared[circuit]?.x1;
  const filed = section.positions[at]?.[field];
  if (wanted === undefined || filed === undefined || wanted <= 0) return [];
  const quick = fitOne(
    (value) => {
      const guess = quickX1(context, section, moved(section, at, field, value), circuit);
      return guess === null ? null : guess / wanted - 1;
    },
    field === 'horizontalM' ? gridOf(-25, 25, 41) : gridOf(6, 70, 33),
    6,
  );
  return quick.flatMap((root) => {
    const exact = (value: number): number | null => {
      const changed = moved(section, at, field, value);
      const x1 = context.bench.changed((_, other) => (other === index ? changed : null))?.circuits[circuit]
        ?.x1;
      return x1 === undefined ? null : x1 / wanted - 1;
    };
    const polished = fitOne(exact, [root - 0.6, root + 0.6], 3);
    return polished.filter((value) => Math.abs(value - filed) > 0.05);
  });
}

function variantOf(
  context: VariantContext,
  section: number,
  candidate: Candidate,
  outcome: Outcome,
  prior: number,
  freedom: number,
): Variant {
  return {
    code: 'position',
    in: 'geometry',
    outcome,
    prior,
    model: ENGINE_MODEL,
    freedom,
    where: `${sectionPointer(context, section)}/positions/${candidate.index}/${candidate.field}`,
    corrected: { [candidate.field]: candidate.value },
    words: candidate.words,
  };
}

function moved(section: OverheadSection, at: number, field: Coordinate, value: number): OverheadSection {
  const positions = section.positions.map((position, index) =>
    index === at ? { ...position, [field]: value } : position,
  );
  return { ...section, positions };
}

/** Heights of all positions but the lowest counted from the lowest arm. */
function fromLowestArm(context: VariantContext): Variant[] {
  return overheadSections(context).flatMap(({ section, index }): Variant[] => {
    const lowest = Math.max(...section.positions.map(({ attachmentHeightM }) => attachmentHeightM));
    const changed = {
      ...section,
      positions: section.positions.map((position) =>
        position.attachmentHeightM === lowest
          ? position
          : { ...position, attachmentHeightM: position.attachmentHeightM + lowest },
      ),
    };
    if (!couldFit(context, section, changed)) return [];
    const outcome = context.bench.changed((_, at) => (at === index ? changed : null));
    if (outcome === null) return [];
    const corrected: Record<string, number> = {};
    changed.positions.forEach((position, at) => {
      corrected[`positions/${at}/attachmentHeightM`] = position.attachmentHeightM;
    });
    return [
      {
        code: 'position',
        in: 'geometry',
        outcome,
        prior: -2,
        model: ENGINE_MODEL,
        freedom: 0,
        where: sectionPointer(context, index),
        corrected,
        words: 'heights are counted from the lowest arm',
      },
    ];
  });
}

/** X1 of a circuit after a change of one section, by the change of its geometric mean spacing alone. */
function quickX1(
  context: VariantContext,
  section: OverheadSection,
  changed: OverheadSection,
  circuit: number,
): number | null {
  const before = spacingOf(section, circuit + 1);
  const after = spacingOf(changed, circuit + 1);
  const x1 = context.base.circuits[circuit]?.x1;
  if (before === null || after === null || x1 === undefined) return null;
  const ohmPerKm = 2 * Math.PI * context.bench.line.frequencyHz * 2e-4;
  return (
    x1 +
    ohmPerKm * (section.lengthKm / context.bench.lengthKm) * Math.log(after.geometricM / before.geometricM)
  );
}

/** A quick look at every declared X1 before the engine is asked. */
function couldFit(context: VariantContext, section: OverheadSection, changed: OverheadSection): boolean {
  return context.base.circuits.every((_, circuit) => {
    const wanted = context.declared[circuit]?.x1;
    if (wanted === undefined) return true;
    const guess = quickX1(context, section, changed, circuit);
    return guess === null || Math.abs(wanted / guess - 1) < QUICK_LOOK;
  });
}
