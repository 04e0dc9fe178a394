import type { Finding } from '../../entities/verdict.entities';
import { PARAMETER_WORDS, type FindingParameter } from '../../../shared/checks/parameters';

/** A parameter as sentences name it: "X1". */
export function parameterLabel(parameter: string): string {
  return Object.hasOwn(PARAMETER_WORDS, parameter)
    ? PARAMETER_WORDS[parameter as FindingParameter].label
    : parameter;
}

/** What a finding is about, in a few words: "X1 of L1". */
export function findingName(finding: Pick<Finding, 'parameter' | 'code' | 'lineKey' | 'circuit'>): string {
  const what = finding.parameter === null ? codeWords(finding.code) : parameterLabel(finding.parameter);
  const circuit = finding.circuit !== null && finding.circuit > 1 ? `, circuit ${finding.circuit}` : '';
  return `${what} of ${finding.lineKey}${circuit}`;
}

/** The matter of a code without a parameter: `drawing.wire-in-ground` is "wire in ground". */
export function codeWords(code: string): string {
  return code.replace(/^[a-z]+\./, '').replaceAll('-', ' ');
}
