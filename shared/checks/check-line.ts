import { sectionMatrices, solveLine } from '../engine/index';
import type { NormalisedLine } from '../filing/types';
import { STARTING_LIBRARY } from '../library/conductors';
import { applyRules } from './apply-rules';
import type { LooseFindings } from './apply-rules';
import { findCauses } from './causes/find-causes';
import type { LineMatters } from './causes/find-causes';
import { impossibleGeometryCauses } from './causes/impossible-geometry';
import { possibleCauses } from './causes/possible-causes';
import type { Matter } from './causes/solve-problem';
import type { CircuitContext, LineContext, PairContext } from './context';
import { circuitContext, lineContext, pairContext } from './contexts';
import { groupFindings, isUncomputed } from './grouping';
import { impliedOf } from './implied';
import type { LineParameter } from './parameters';
import type { RuleSet } from './rule-set';
import type { AtFrequency, CheckOptions, CircuitReport, Finding, LineReport, MatricesReport } from './types';
import { rangeOf, weighedValues } from './weighed-values';

/**
 * Checks one line: recomputes it, weighs what is declared, and seeks the slips behind what does not balance. The live
 * check of the form and the check after filing take this same road.
 *
 * @param line the line as read
 * @param rules bands, tolerances, uncertainties
 * @param options what is wanted beside the findings
 * @returns the report; it never throws
 */
export function checkLine(line: NormalisedLine, rules: RuleSet, options: CheckOptions = {}): LineReport {
  const context = lineContext(line, rules);
  const circuits = line.circuits.map((circuit) => circuitContext(context, circuit));
  const pairs = line.mutual.map((mutual) => pairContext(context, mutual, circuits));
  const loose = applyRules(context, circuits, pairs);
  const wantsCauses = options.causes !== false;
  const library = options.library ?? STARTING_LIBRARY.conductors;
  const matters = wantsCauses ? mattersOf(context, circuits, pairs, loose, library) : NO_MATTERS;
  const lineCauses =
    wantsCauses && loose.line.some(isUncomputed) ? impossibleGeometryCauses(context, circuits, library) : [];
  const grouped = groupFindings(loose, matters, lineCauses, wantsCauses);
  const matrices = options.matrices === true ? matricesOf(line) : undefined;
  return {
    name: line.name,
    bandClassKv: context.match?.classKv ?? null,
    circuits: circuits.map((one, index) =>
      circuitReport(
        one,
        grouped.circuits[index] ?? [],
        loose.circuits[index] ?? [],
        options.frequenciesHz ?? [],
      ),
    ),
    findings: [...grouped.line, ...grouped.pairs.flat()],
    mutual: context.recomputation.ok
      ? context.recomputation.constants.mutual.map((pair) => ({ ...pair }))
      : [],
    ...(matrices === undefined ? {} : { matrices }),
  };
}

const NO_MATTERS: LineMatters = { circuits: [], pairs: [] };

function mattersOf(
  context: LineContext,
  circuits: readonly CircuitContext[],
  pairs: readonly PairContext[],
  loose: LooseFindings,
  library: NonNullable<CheckOptions['library']>,
): LineMatters {
  if (context.recomputation.ok) return findCauses(context, circuits, pairs, library);
  return {
    circuits: circuits.map((one, index): Matter[] => {
      const isQuestioned = (loose.circuits[index] ?? []).some(
        ({ grade, parameter }) =>
          grade === 'must-answer' && parameter !== undefined && CARRIERS.has(parameter),
      );
      const causes = context.isOverhead && isQuestioned ? possibleCauses(one) : [];
      return causes.length === 0
        ? []
        : [{ explains: [...new Set(causes.flatMap(({ explains }) => explains))], causes }];
    }),
    pairs: [],
  };
}

/** Without geometry these parameters are what shows a slip in X1 or B1. */
const CARRIERS: ReadonlySet<string> = new Set(['x1', 'b1', 'waveSpeed', 'surgeImpedanceOhm', 'x1OverR1']);

function circuitReport(
  context: CircuitContext,
  findings: Finding[],
  loose: LooseFindings['line'],
  frequenciesHz: readonly number[],
): CircuitReport {
  const { line, recomputation } = context.lineContext;
  const index = context.circuit.circuit - 1;
  const equivalent = recomputation.ok ? recomputation.constants.equivalent[index] : undefined;
  return {
    circuit: context.circuit.circuit,
    declared: context.declared,
    recomputed: context.recomputed,
    equivalent: equivalent === undefined ? null : { ...equivalent },
    range: ranges(context),
    ...(frequenciesHz.length === 0 ? {} : { frequencies: atFrequencies(line, index, frequenciesHz) }),
    findings,
    implied: impliedOf(context),
    values: weighedValues(context, loose),
  };
}

function ranges(context: CircuitContext): CircuitReport['range'] {
  if (context.constants === null) return null;
  const of = (parameter: LineParameter): [number, number] => rangeOf(context, parameter) ?? [NaN, NaN];
  return { r1: of('r1'), x1: of('x1'), b1: of('b1'), r0: of('r0'), x0: of('x0'), b0: of('b0') };
}

/** Handbook resistance and GMR are kept at every frequency. */
function atFrequencies(
  line: NormalisedLine,
  circuit: number,
  frequenciesHz: readonly number[],
): AtFrequency[] {
  const { engineInput } = line;
  if (engineInput === null) return [];
  return frequenciesHz.flatMap((frequencyHz): AtFrequency[] => {
    const solved = solveLine(engineInput, frequencyHz);
    const constants = solved.ok ? solved.value.circuits[circuit] : undefined;
    if (constants === undefined) return [];
    const { r1, x1, b1, r0, x0, b0 } = constants;
    return [{ frequencyHz, r1, x1, b1, r0, x0, b0 }];
  });
}

function matricesOf(line: NormalisedLine): MatricesReport | undefined {
  const [section] = line.sections;
  if (line.sections.length !== 1 || section?.kind !== 'overhead') return undefined;
  const solved = sectionMatrices(section.input, line.frequencyHz);
  if (!solved.ok) return undefined;
  const { phaseImpedanceOhmPerKm, phaseSusceptanceMicrosiemensPerKm } = solved.value;
  return { phaseImpedanceOhmPerKm, phaseSusceptanceMicrosiemensPerKm };
}
