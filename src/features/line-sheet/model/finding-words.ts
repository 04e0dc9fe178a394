import type { Cause, Finding } from '#shared/contracts/api.generated';
import { PARAMETER_WORDS, type FindingParameter } from '#shared/checks/parameters';
import { formatDate } from '#shared/format/dates';

/** The name of a parameter as sentences use it. */
export function nameOf(parameter: string): string {
  return Object.hasOwn(PARAMETER_WORDS, parameter)
    ? PARAMETER_WORDS[parameter as FindingParameter].label
    : parameter;
}

const joined = (words: readonly string[]) =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1) ?? ''}`;

/** What a cause would bring back besides the finding it stands under. */
function alsoExplains(cause: Cause, parameter: string | null): string {
  const others = cause.explains.filter((p) => p !== parameter).map(nameOf);
  return others.length === 0 ? '' : ` It also explains ${joined(others)}.`;
}

/**
 * The lines behind a finding's elbow. One matter stands once: the first of a group carries its causes, the others
 * say so. (Where no slip fits, the finding's own message says it.)
 */
export function causeLines(finding: Finding, carries: boolean): string[] {
  if (finding.follows !== null) {
    return [finding.follows === finding.parameter ? 'Same cause.' : `Follows ${nameOf(finding.follows)}.`];
  }
  if (finding.causes.length === 0) return !finding.first && finding.group !== null ? ['Same cause.'] : [];
  if (!carries) return ['Same cause.'];
  return finding.causes.map((cause) => `${cause.sentence}${alsoExplains(cause, finding.parameter)}`);
}

const KIND_WORDS = { settled: 'Settled', waived: 'Waived', 'set-aside': 'Set aside' } as const;

/** What became of a finding, as a sentence; null while nothing has. */
export function dispositionWords(finding: Finding): string | null {
  const { disposition } = finding;
  if (disposition === null) return null;
  const kind = KIND_WORDS[disposition.kind];
  const when = `on revision ${disposition.revision}, ${formatDate(disposition.at)}`;
  const reason = disposition.reason ? `: ${disposition.reason}` : '.';
  if (!disposition.inForce) {
    return `${disposition.by.name} proposes to ${disposition.kind === 'waived' ? 'waive it' : 'settle it'}; a second reviewer has to countersign${reason}`;
  }
  const second = disposition.countersignedBy ? `, countersigned by ${disposition.countersignedBy.name}` : '';
  const carried = disposition.carriedOver
    ? ' and carried over, since code, circuit and figures are equal'
    : '';
  return `${kind} by ${disposition.by.name}${second} ${when}${carried}${reason}`;
}

/** The short verdict of a settled value: "X0 settled". */
export function settledRemark(findings: readonly Finding[]): string | undefined {
  const counted = findings.filter((f) => f.follows === null);
  const first = counted[0];
  if (!first || counted.some((f) => f.stands)) return undefined;
  const name = first.parameter === null ? 'It' : nameOf(first.parameter);
  return `${name} ${(first.disposition ? KIND_WORDS[first.disposition.kind] : 'Settled').toLowerCase()}`;
}
