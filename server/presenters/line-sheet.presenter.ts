import type * as Api from '../../shared/contracts/api.generated';
import type { FilingLine } from '../../shared/contracts/filing.generated';
import type { CircuitReport, LineReport, Weighed } from '../../shared/checks/types';

type Sheet = Pick<Api.RevisionLine, 'bandClassKv' | 'values' | 'equivalents' | 'mutual' | 'impliedGeometry'>;

/** What the check says of a line: balance rows, whole-line values, couplings, implied geometry. */
export function presentSheet(
  report: LineReport | null,
  line: FilingLine,
  sourceOf: (parameter: string) => string | null,
): Sheet {
  if (report === null) {
    return { bandClassKv: null, values: [], equivalents: [], mutual: [], impliedGeometry: [] };
  }
  const { circuits } = report;
  return {
    bandClassKv: report.bandClassKv,
    values: circuits.flatMap((circuit) =>
      circuit.values.map((value) => ({
        ...presentValue(value, circuit.circuit, line),
        source: value.typical === null ? null : sourceOf(value.parameter),
      })),
    ),
    equivalents: circuits.flatMap(({ circuit, equivalent }) =>
      equivalent === null ? [] : [{ circuit, ...equivalent }],
    ),
    mutual: report.mutual.map(({ circuits: pair, r0m, x0m, b0m }) => ({ circuits: pair, r0m, x0m, b0m })),
    impliedGeometry: circuits.flatMap(presentImplied),
  };
}

function presentValue(value: Weighed, circuit: number, line: FilingLine): Omit<Api.ParameterValue, 'source'> {
  const { parameter, declared, recomputed, range, deviation, tolerance, typical, outer, grade } = value;
  return {
    circuit,
    parameter,
    declared,
    asDeclared: asDeclared(line, circuit, parameter),
    recomputed,
    low: range?.[0] ?? null,
    high: range?.[1] ?? null,
    deviation,
    tolerance,
    typical: typical === null ? null : [typical[0], typical[1]],
    outer: outer === null ? null : [outer[0], outer[1]],
    grade,
    follows: value.follows,
  };
}

/** A value as the filing has it, with its own unit: "0.613 ohm/mi". */
function asDeclared(line: FilingLine, circuit: number, parameter: string): string | null {
  const declared = line.declared.find((entry) => entry.circuit === circuit);
  const value: unknown = declared === undefined ? undefined : declared[parameter as keyof typeof declared];
  if (typeof value !== 'object' || value === null || !('value' in value) || !('unit' in value)) return null;
  return `${String(value.value)} ${String(value.unit)}`;
}

function presentImplied({ circuit, implied }: CircuitReport): Api.RevisionLine['impliedGeometry'] {
  if (implied === null) return [];
  const { meanSpacingM, gmrMm, sentence } = implied;
  return [{ circuit, meanSpacingM: positive(meanSpacingM), gmrMm: positive(gmrMm), sentence }];
}

function positive(value: number): number | null {
  return Number.isFinite(value) && value >= 0 ? value : null;
}

/** Declared and recomputed values of the revision before, for comparison. */
export function presentPrevious(report: LineReport): NonNullable<Api.RevisionLine['previous']> {
  return report.circuits.flatMap(({ circuit, values }) =>
    values
      .filter((value) => /^[rxb][01]$/.test(value.parameter))
      .map(({ parameter, declared, recomputed }) => ({ circuit, parameter, declared, recomputed })),
  );
}
