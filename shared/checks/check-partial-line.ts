import type { PartialLine } from '../filing/read-partial-line';
import type { NormalisedLine } from '../filing/types';
import { checkLine } from './check-line';
import type { RuleSet } from './rule-set';
import type { CheckOptions, CircuitReport, Finding, LineReport } from './types';

/** Findings that only say what is not there yet: of a line that is being written, that is no news. */
const OWED: ReadonlySet<string> = new Set([
  'drawing.geometry-missing',
  'drawing.zero-sequence-not-given',
  'drawing.coupling-not-given',
  'drawing.sag-not-given',
]);

const isNews = ({ code }: Finding): boolean => !OWED.has(code);

/** The line with the sections whose geometry is whole as the engine takes them, and nothing declared. */
function geometryAlone(line: NormalisedLine): NormalisedLine {
  const inputs = line.sections.flatMap((section) =>
    section.kind === 'geometry-missing' ? [] : [section.input],
  );
  return {
    ...line,
    engineInput: { frequencyHz: line.frequencyHz, sections: inputs },
    circuits: line.circuits.map((circuit) => ({ ...circuit, declared: {} })),
  };
}

/** A circuit with what the whole sections give beside its declared values, the two not weighed against each other. */
function beside(circuit: CircuitReport, drawn: CircuitReport | undefined): CircuitReport {
  if (!drawn?.recomputed) return circuit;
  const values = circuit.values.map((value) => {
    const other = drawn.values.find(({ parameter }) => parameter === value.parameter);
    return { ...value, recomputed: other?.recomputed ?? null, range: other?.range ?? null };
  });
  return { ...circuit, recomputed: drawn.recomputed, range: drawn.range, values };
}

/**
 * Checks what can be weighed of a line that is still being written: what its whole sections give, what is declared,
 * and the band of its class. Declared values are of the whole line, so they are weighed against the geometry once
 * every section has its own; until then both stand side by side.
 *
 * @param partial the line as far as it holds
 * @param rules bands, tolerances, uncertainties
 * @param options what is wanted beside the findings
 * @returns the report of the parts; it never throws
 */
export function checkPartialLine(
  { line, whole }: PartialLine,
  rules: RuleSet,
  options: CheckOptions = {},
): LineReport {
  const report = checkLine(line, rules, options);
  const isSplit = whole.length > 0 && whole.length < line.sections.length;
  const drawn = isSplit ? checkLine(geometryAlone(line), rules, { causes: false }).circuits : [];
  return {
    ...report,
    circuits: report.circuits.map((circuit, i) =>
      beside({ ...circuit, findings: circuit.findings.filter(isNews) }, drawn[i]),
    ),
    findings: report.findings.filter(isNews),
  };
}
