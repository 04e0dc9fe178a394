import { handCheck, impliedGeometry } from '../engine/index';
import type { OverheadSection, PhasePosition } from '../engine/index';
import { gmrOf } from './causes/variants/gmr-of';
import { spacingOf } from './causes/variants/spacing';
import type { CircuitContext } from './context';
import { dimensionsAt } from './rules/drawing/voltage-table';
import type { ImpliedGeometry } from './types';
import { figure, withUnit } from './words';

/**
 * The mean phase spacing and the GMR that the declared X1 and B1 of a circuit would need, beside those filed and those
 * usual at the voltage. Read off the line's longest overhead section.
 *
 * @param context a circuit
 * @returns null without geometry, or when no geometry at all gives such values
 */
export function impliedOf(context: CircuitContext): ImpliedGeometry | null {
  const { x1, b1 } = context.declared;
  const { line } = context.lineContext;
  const section = longestSection(context);
  if (section === null || x1 === undefined || b1 === undefined) return null;
  const phase = section.positions.find(
    (position): position is PhasePosition =>
      position.kind === 'phase' && position.circuit === context.circuit.circuit,
  );
  const spacing = spacingOf(section, context.circuit.circuit);
  if (phase === undefined || spacing === null) return null;
  const { bundleCount, bundleSpacingM, conductor } = phase;
  const reference = handCheck(section, line.frequencyHz, context.circuit.circuit);
  const implied = impliedGeometry({
    x1,
    b1,
    frequencyHz: line.frequencyHz,
    diameterMm: conductor.diameterMm,
    bundleCount,
    bundleSpacingM,
    ...(reference.ok ? { reference: reference.value } : {}),
  });
  if (implied === null) return null;
  const filed = { meanSpacingM: spacing.geometricM, gmrMm: gmrOf(conductor) };
  const typicalSpacingM = dimensionsAt(line.nominalVoltageKv)?.usualSpacingM ?? null;
  const { meanSpacingM, gmrMm } = implied;
  return {
    meanSpacingM,
    gmrMm,
    filed,
    typicalSpacingM,
    sentence: sentenceOf(implied, filed, typicalSpacingM, conductor.diameterMm),
  };
}

function longestSection(context: CircuitContext): OverheadSection | null {
  if (context.constants === null) return null;
  let longest: OverheadSection | null = null;
  for (const section of context.lineContext.line.sections) {
    if (section.kind !== 'overhead') continue;
    if (longest === null || section.lengthKm > longest.lengthKm) longest = section.input;
  }
  return longest;
}

/** Spacing or GMR this share away from what is filed is worth saying so. */
const FAR = 0.1;

function sentenceOf(
  implied: { meanSpacingM: number; gmrMm: number },
  filed: { meanSpacingM: number; gmrMm: number },
  usual: readonly [number, number] | null,
  diameterMm: number,
): string {
  const { meanSpacingM, gmrMm } = implied;
  const needs = `X1 and B1 as declared need phases ${withUnit(meanSpacingM, 'm')} apart in the mean and a GMR of ${withUnit(gmrMm, 'mm')}`;
  const drawn = `the drawing has ${withUnit(filed.meanSpacingM, 'm')} and ${withUnit(filed.gmrMm, 'mm')}`;
  const range =
    usual === null
      ? ''
      : `; usual at this voltage are ${figure(usual[0])} to ${withUnit(usual[1], 'm')} between phases`;
  const isFar =
    Math.abs(meanSpacingM / filed.meanSpacingM - 1) > FAR || Math.abs(gmrMm / filed.gmrMm - 1) > FAR;
  const verdict = gmrMm > diameterMm / 2 ? ' No conductor has a GMR larger than its radius.' : '';
  return isFar ? `${needs}; ${drawn}${range}.${verdict}` : `${needs}; ${drawn}${range}.`;
}
