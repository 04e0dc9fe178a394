import type { LineParameter, MutualParameter } from '../../parameters';
import type { Weighing } from '../../weigh';
import { label, partsBy, percent, quantity } from '../../words';
import type { CircuitRule, FindingDraft } from '../rule';
import { pointerOf } from '../rule';

const FORM_WORDS = {
  'equivalent-pi':
    'read as the equivalent pi of the whole line, which lies nearer than length × per-length value',
  'length-times-per-length':
    'read as length × per-length value, which lies nearer than the equivalent pi of the whole line',
} as const;

/** Forms that part by less than this are not worth naming. */
const FORMS_PART = 0.002;

/**
 * The finding for a declared value that parts from the recomputed one by more than the tolerance.
 *
 * @returns none when it is within tolerance
 */
export function contradicted(
  parameter: LineParameter | MutualParameter,
  weighing: Weighing | undefined,
  where: string,
): FindingDraft[] {
  if (weighing === undefined || !weighing.contradicted) return [];
  const { declared, recomputed, deviation, tolerance } = weighing;
  return [
    {
      grade: 'must-answer',
      parameter,
      declared: declared.perKm,
      recomputed,
      deviation,
      tolerance: tolerance.total,
      toleranceOf: {
        administrator: tolerance.administrator,
        inputs: tolerance.inputs,
        dominantInput: tolerance.dominantInput,
        rounding: tolerance.rounding,
      },
      where,
      message: sentences(parameter, weighing),
    },
  ];
}

function sentences(parameter: LineParameter | MutualParameter, weighing: Weighing): string {
  const { declared, recomputed, tolerance } = weighing;
  const parts = partsBy(parameter, declared.perKm / recomputed);
  const form =
    weighing.form !== null && weighing.formsPart > FORMS_PART ? ` (${FORM_WORDS[weighing.form]})` : '';
  const figures = `${quantity(parameter, declared.perKm, 4)} declared, ${quantity(parameter, recomputed, 4)} recomputed`;
  // A cable's values are taken as declared: no input stands behind them.
  const known =
    tolerance.inputs > 0
      ? `, ${percent(tolerance.inputs)} by what the inputs are known to, most of it ${tolerance.dominantInput}`
      : '';
  const allowed = `tolerance ${percent(tolerance.total)}: ${percent(tolerance.administrator)} by rule${known}`;
  const inside = weighing.insideRange
    ? ` It lies inside the plausible range of ${label(parameter)}, and beyond the cap of the tolerance.`
    : '';
  return `${parts}${form}: ${figures}; ${allowed}.${inside}`;
}

/** A rule that holds one constant of a circuit against the geometry. */
export function circuitGeometryRule(parameter: LineParameter, sentence: string, source: string): CircuitRule {
  return {
    code: `geometry.${parameter}`,
    family: 'geometry',
    grades: ['must-answer'],
    parameter,
    needs: `${label(parameter)} and the positions of every overhead section`,
    sentence,
    source,
    on: 'circuit',
    apply: (context) => contradicted(parameter, context.weighings[parameter], pointerOf(context, parameter)),
  };
}
