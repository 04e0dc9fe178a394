import { roundingShare } from '../../context';
import type { CircuitContext } from '../../context';
import { bandValue } from '../../derive';
import type { PartialConstants } from '../../derive';
import { MADE_OF, isLineParameter } from '../../parameters';
import type { BandParameter } from '../../parameters';
import type { Band } from '../../rule-set';
import { digitsApart, figure, label, quantity } from '../../words';
import { pointerOf } from '../rule';
import type { CircuitRule, FindingDraft } from '../rule';

type Side = 'declared' | 'recomputed';

/**
 * Holds one parameter of a circuit, declared and recomputed, against the band of its voltage class. Outside the
 * typical range it asks for an explanation, outside the outer one for an answer. The heavier of the two sides
 * is told; the declared one where they weigh the same.
 */
export function outsideBand(context: CircuitContext, parameter: BandParameter): FindingDraft[] {
  const band = context.lineContext.match?.bands.get(parameter);
  if (band === undefined || !context.lineContext.isOverhead) return [];
  const declared = declaredValue(context, parameter);
  const recomputed = sideValue(context, parameter, context.constants ?? undefined);
  const declaredGrade =
    declared === undefined ? null : gradeOf(declared, roundingOf(context, parameter), band);
  const recomputedGrade = recomputed === undefined ? null : gradeOf(recomputed, 0, band);
  if (declaredGrade === null && recomputedGrade === null) return [];
  const side: Side =
    declaredGrade === 'must-answer' || recomputedGrade !== 'must-answer'
      ? declaredGrade === null
        ? 'recomputed'
        : 'declared'
      : 'recomputed';
  const grade = side === 'declared' ? declaredGrade : recomputedGrade;
  const value = side === 'declared' ? declared : recomputed;
  if (grade === null || value === undefined) return [];
  return [
    {
      grade,
      parameter,
      ...(declared === undefined ? {} : { declared }),
      ...(recomputed === undefined ? {} : { recomputed }),
      band: { classKv: band.classKv, typical: band.typical, outer: band.outer },
      where: pointerOf(context, MADE_OF[parameter].find(isLineParameter) ?? 'x1'),
      message: sentence(parameter, value, side, grade === 'must-answer', band),
    },
  ];
}

function declaredValue(context: CircuitContext, parameter: BandParameter): number | undefined {
  return sideValue(context, parameter, context.declared);
}

function sideValue(
  context: CircuitContext,
  parameter: BandParameter,
  values: PartialConstants | undefined,
): number | undefined {
  if (values === undefined) return undefined;
  const value = bandValue(parameter, values, context.lineContext.line.frequencyHz);
  return value !== undefined && Number.isFinite(value) ? value : undefined;
}

/** Share by which rounding of the written digits can move the declared value. */
function roundingOf(context: CircuitContext, parameter: BandParameter): number {
  const shares = MADE_OF[parameter]
    .filter(isLineParameter)
    .map((of) => roundingShare(context.circuit.declared[of]));
  const sum = shares.reduce((total, share) => total + share, 0);
  return parameter === 'waveSpeed' || parameter === 'surgeImpedanceOhm' ? sum / 2 : sum;
}

/** Rounding coarser than this share turns an answer that rounding could explain into an explanation. */
const COARSE_ROUNDING = 0.03;

function gradeOf(value: number, rounding: number, band: Band): 'must-answer' | 'explain' | null {
  if (outside(value, 0, band.outer)) {
    const explained = !outside(value, rounding, band.outer) && rounding > COARSE_ROUNDING;
    return explained ? 'explain' : 'must-answer';
  }
  return outside(value, rounding, band.typical) ? 'explain' : null;
}

function outside(value: number, rounding: number, [low, high]: readonly [number, number]): boolean {
  const half = Math.abs(value) * rounding;
  return value + half < low || value - half > high;
}

function sentence(parameter: BandParameter, value: number, side: Side, isOuter: boolean, band: Band): string {
  const [low, high] = isOuter ? band.outer : band.typical;
  const subject = side === 'declared' ? label(parameter) : `${label(parameter)} of the geometry`;
  const limit = value < low ? low : high;
  const digits = digitsApart(value, limit);
  const beyond = `${value < low ? 'below' : 'above'} ${figure(limit)}`;
  const range = isOuter ? 'the outer limit' : 'the typical limit';
  return `${subject} is ${quantity(parameter, value, digits)}, ${beyond}, ${range} at ${figure(band.classKv)}\u2009kV.`;
}

/** A rule that holds one parameter against its band. */
export function bandRule(
  name: string,
  parameter: BandParameter,
  needs: string,
  sentenceOfRule: string,
): CircuitRule {
  return {
    code: `typical.${name}`,
    family: 'typical',
    grades: ['must-answer', 'explain'],
    parameter,
    needs,
    sentence: sentenceOfRule,
    source: 'the band of the voltage class; each bound names its own source',
    on: 'circuit',
    apply: (context) => outsideBand(context, parameter),
  };
}
