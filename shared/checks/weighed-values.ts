import type { LooseFinding } from './apply-rules';
import type { CircuitContext } from './context';
import { bandValue } from './derive';
import { BAND_PARAMETERS, LINE_PARAMETERS, MADE_OF, isLineParameter } from './parameters';
import type { BandParameter, FindingParameter, LineParameter } from './parameters';
import { GRADES } from './types';
import type { Grade, Weighed } from './types';

/** The parameters of a balance sheet, constants first, each once. */
const SHEET: readonly (LineParameter | BandParameter)[] = [
  ...LINE_PARAMETERS,
  ...BAND_PARAMETERS.filter((parameter) => !isLineParameter(parameter)),
];

/**
 * Every value of a circuit as it was weighed: declared, recomputed, its range, its band and the worst grade that it got.
 *
 * @param context the circuit
 * @param findings what the rules said of it
 */
export function weighedValues(context: CircuitContext, findings: readonly LooseFinding[]): Weighed[] {
  return SHEET.map((parameter): Weighed => {
    const { declared, recomputed } = valuesOf(context, parameter);
    const weighing = isLineParameter(parameter) ? context.weighings[parameter] : undefined;
    const band = isBand(parameter) ? context.lineContext.match?.bands.get(parameter) : undefined;
    const own = findings.filter((finding) => finding.parameter === parameter);
    return {
      parameter,
      declared,
      recomputed: weighing?.recomputed ?? recomputed,
      range: isLineParameter(parameter) ? rangeOf(context, parameter) : null,
      deviation: weighing?.deviation ?? deviationOf(declared, recomputed),
      tolerance: weighing?.tolerance.total ?? null,
      typical: band?.typical ?? null,
      outer: band?.outer ?? null,
      grade: worstOf(own.map(({ grade }) => grade)),
      follows: followedBy(context, parameter, own),
    };
  });
}

/** The constant that a value follows: where each of its findings follows one, or it is made of one that is contradicted. */
function followedBy(
  context: CircuitContext,
  parameter: LineParameter | BandParameter,
  own: readonly LooseFinding[],
): FindingParameter | null {
  if (own.some(({ follows }) => follows === undefined)) return null;
  const told = own.find(({ follows }) => follows !== undefined)?.follows;
  if (told !== undefined || isLineParameter(parameter)) return told ?? null;
  const parts = MADE_OF[parameter].filter(isLineParameter);
  return parts.find((part) => context.weighings[part]?.contradicted === true) ?? null;
}

function isBand(parameter: LineParameter | BandParameter): parameter is BandParameter {
  return (BAND_PARAMETERS as readonly string[]).includes(parameter);
}

function valuesOf(
  context: CircuitContext,
  parameter: LineParameter | BandParameter,
): { declared: number | null; recomputed: number | null } {
  const { frequencyHz } = context.lineContext.line;
  const read = (values: CircuitContext['declared'] | null): number | null => {
    if (values === null) return null;
    const value = isBand(parameter) ? bandValue(parameter, values, frequencyHz) : values[parameter];
    return value !== undefined && Number.isFinite(value) ? value : null;
  };
  return { declared: read(context.declared), recomputed: read(context.constants) };
}

/** [low, high] of one recomputed constant. */
export function rangeOf(context: CircuitContext, parameter: LineParameter): [number, number] | null {
  const { recomputation } = context.lineContext;
  const value = context.constants?.[parameter];
  if (!recomputation.ok || value === undefined) return null;
  const half = recomputation.spreads.circuits[context.circuit.circuit - 1]?.[parameter].halfRange ?? 0;
  return [value - half, value + half];
}

function deviationOf(declared: number | null, recomputed: number | null): number | null {
  return declared === null || recomputed === null || recomputed === 0 ? null : declared / recomputed - 1;
}

/** The heaviest of some grades; null of none. */
export function worstOf(grades: readonly Grade[]): Grade | null {
  return GRADES.find((grade) => grades.includes(grade)) ?? null;
}
