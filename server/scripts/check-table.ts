import { PARAMETER_WORDS } from '../../shared/checks/parameters';
import type {
  CheckReport,
  CircuitReport,
  Finding,
  Grade,
  LineReport,
  Weighed,
} from '../../shared/checks/types';
import { figure, percent } from '../../shared/checks/words';
import type { Fault } from '../../shared/contracts/faults';

/** What the terminal is told for each grade: a mark, a word, a colour of the sixteen. */
const GRADE_WORDS: Readonly<Record<Grade | 'balance', { mark: string; word: string; colour: number }>> = {
  'must-answer': { mark: '■', word: 'Must answer', colour: 31 },
  explain: { mark: '◆', word: 'Explain', colour: 33 },
  note: { mark: '○', word: 'Note', colour: 34 },
  balance: { mark: '—', word: 'In balance', colour: 32 },
};

const CAUTION =
  'The check compares declared data with a calculation. It replaces no engineering study; local codes and the judgement of licensed engineers govern.';

type Paint = (text: string, colour: number) => string;

/**
 * A report as lines for people.
 *
 * @param report the check
 * @param hasColours whether they are read on a terminal
 */
export function reportLines(report: CheckReport, hasColours: boolean): string[] {
  const paint: Paint = (text, colour) => (hasColours ? `\u001b[${colour}m${text}\u001b[0m` : text);
  const bold = (text: string): string => (hasColours ? `\u001b[1m${text}\u001b[0m` : text);
  const lines = report.lines.flatMap((line) => ['', bold(line.name), ...lineLines(line, paint)]);
  return [...lines.slice(1), '', ...summaryLines(report)];
}

/** How much must be answered, by which rules, and the caution. */
export function summaryLines(report: CheckReport): string[] {
  return [summary(report), versions(report), CAUTION];
}

function lineLines(line: LineReport, paint: Paint): string[] {
  const circuits = line.circuits.flatMap((circuit) => [
    ...(line.circuits.length > 1 ? [`  circuit ${circuit.circuit}`] : []),
    ...valueLines(circuit, paint),
  ]);
  const told = new Set<number>();
  const findings = [...line.circuits.flatMap((circuit) => circuit.findings), ...line.findings];
  const ordered = findings.filter(({ follows }) => follows === undefined);
  const implied = line.circuits.flatMap(({ findings: own, implied: needs }) =>
    needs !== null && own.some(({ code }) => code === 'geometry.x1' || code === 'geometry.b1')
      ? [`  ${needs.sentence}`]
      : [],
  );
  return [...circuits, ...ordered.flatMap((finding) => findingLines(finding, told, paint)), ...implied];
}

const COLUMNS = [24, 12, 12, 11, 20] as const;

function valueLines({ values }: CircuitReport, paint: Paint): string[] {
  const head = ['', 'declared', 'recomputed', 'off by', 'typical'].map((text, at) => pad(text, at)).join('');
  const rows = values
    .filter(({ declared, recomputed }) => declared !== null || recomputed !== null)
    .map((value) => valueLine(value, paint));
  return [`  ${head}`.trimEnd(), ...rows];
}

function valueLine(value: Weighed, paint: Paint): string {
  const { label, unit } = PARAMETER_WORDS[value.parameter];
  const cells = [
    unit === '' ? label : `${label}, ${unit}`,
    value.declared === null ? '' : figure(value.declared, 4),
    value.recomputed === null ? '' : figure(value.recomputed, 4),
    value.deviation === null || value.declared === null ? '' : signed(value.deviation),
    value.typical === null ? '' : `${figure(value.typical[0])} to ${figure(value.typical[1])}`,
  ];
  const { mark, word, colour } = GRADE_WORDS[value.grade ?? 'balance'];
  const follows = value.follows === null ? word : `follows ${PARAMETER_WORDS[value.follows].label}`;
  return `  ${cells.map((text, at) => pad(text, at)).join('')}${paint(`${mark} ${follows}`, colour)}`;
}

/** Shares below this are rounding of the digits shown. */
const NOTHING = 5e-5;

function signed(share: number): string {
  if (Math.abs(share) < NOTHING) return percent(0);
  if (Math.abs(share) >= 9.995) return `× ${figure(share + 1)}`;
  return `${share < 0 ? '\u2212' : '+'}${percent(share)}`;
}

function pad(text: string, column: number): string {
  const width = COLUMNS[column] ?? 0;
  return column === 0 || column === 4
    ? `${column === 4 ? '  ' : ''}${text.padEnd(width)}`
    : text.padStart(width);
}

function findingLines(finding: Finding, told: Set<number>, paint: Paint): string[] {
  const { mark, word, colour } = GRADE_WORDS[finding.grade];
  const circuit = finding.circuit === undefined ? '' : ` (circuit ${finding.circuit})`;
  const head = `  ${paint(`${mark} ${word}`, colour)} ${finding.code}${circuit}: ${finding.message}`;
  if (finding.causes.length === 0) return [head];
  if (told.has(finding.group)) return [head, '      Same cause.'];
  told.add(finding.group);
  return [head, ...finding.causes.map(({ code, sentence }) => `      ${sentence} [${code}]`)];
}

function summary({ lines }: CheckReport): string {
  const all = lines.flatMap((line) => [
    ...line.circuits.flatMap(({ findings }) => findings),
    ...line.findings,
  ]);
  const count = (grade: Grade): number =>
    all.filter((one) => one.grade === grade && one.follows === undefined).length;
  const notes = count('note');
  const size = lines.length === 1 ? '1 line' : `${lines.length} lines`;
  return `${size}: ${count('must-answer')} must be answered, ${count('explain')} to explain, ${notes === 1 ? '1 note' : `${notes} notes`}.`;
}

function versions({ engine, bands, tolerances }: CheckReport): string {
  return `Engine ${engine}, bands ${bands}, tolerances ${tolerances}.`;
}

/** Faults as lines for people. */
export function faultLines(of: string, faults: readonly Fault[]): string[] {
  const head = `${of} is not usable: ${faults.length === 1 ? 'one fault' : `${faults.length} faults`}.`;
  const rows = faults.map((fault) => {
    const place =
      'pointer' in fault
        ? fault.pointer
        : `row ${fault.row}${fault.column === '' ? '' : `, ${fault.column}`}`;
    return place === '' ? `  ${fault.message}` : `  ${place}: ${fault.message}`;
  });
  return [head, ...rows];
}
