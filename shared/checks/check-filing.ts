import { ENGINE_VERSION } from '../engine/index';
import type { NormalisedFiling } from '../filing/types';
import { checkLine } from './check-line';
import type { RuleSet } from './rule-set';
import type { CheckOptions, CheckReport, Finding, Grade } from './types';
import { worstOf } from './weighed-values';

/**
 * Checks every line of a filing.
 *
 * @param filing the filing as read
 * @param rules bands, tolerances, uncertainties, with their versions
 * @param options what is wanted beside the findings
 * @returns the report that `npm run check -- --json` prints
 */
export function checkFiling(
  filing: NormalisedFiling,
  rules: RuleSet,
  options: CheckOptions = {},
): CheckReport {
  return {
    engine: ENGINE_VERSION,
    bands: rules.bandsVersion,
    tolerances: rules.tolerancesVersion,
    lines: filing.lines.map((line) => checkLine(line, rules, options)),
  };
}

/** Every finding of a report, line by line: circuits first, then what stands at the line. */
export function findingsOf(report: Pick<CheckReport, 'lines'>): Finding[] {
  return report.lines.flatMap((line) => [
    ...line.circuits.flatMap(({ findings }) => findings),
    ...line.findings,
  ]);
}

/** The heaviest grade in a report; null when it has no finding. */
export function worstGrade(report: Pick<CheckReport, 'lines'>): Grade | null {
  return worstOf(findingsOf(report).map(({ grade }) => grade));
}
