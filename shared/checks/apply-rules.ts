import type { CircuitContext, LineContext, PairContext } from './context';
import { MADE_OF } from './parameters';
import type { FindingParameter } from './parameters';
import { RULES } from './rules/table';
import type { FindingDraft, Rule } from './rules/rule';
import type { Finding, Grade } from './types';
import { GRADES } from './types';

/** A finding before it belongs to a group. */
export type LooseFinding = Omit<Finding, 'group' | 'causes'>;

/** Everything that the rules say of one line. */
export interface LooseFindings {
  line: LooseFinding[];
  circuits: LooseFinding[][];
  pairs: LooseFinding[][];
}

/** Applies every rule to a line, its circuits and its pairs. */
export function applyRules(
  context: LineContext,
  circuits: readonly CircuitContext[],
  pairs: readonly PairContext[],
): LooseFindings {
  const line = RULES.flatMap((rule) => (rule.on === 'line' ? told(rule, rule.apply(context)) : []));
  const ofCircuits = circuits.map((one) => {
    const found = RULES.flatMap((rule) => (rule.on === 'circuit' ? told(rule, rule.apply(one)) : []));
    return following(found.map((finding) => ({ ...finding, circuit: one.circuit.circuit })));
  });
  const ofPairs = pairs.map((one) =>
    RULES.flatMap((rule) => (rule.on === 'pair' ? told(rule, rule.apply(one)) : [])),
  );
  return { line, circuits: ofCircuits, pairs: ofPairs };
}

function told(rule: Rule, drafts: readonly FindingDraft[]): LooseFinding[] {
  return drafts.map((draft) => ({ code: rule.code, family: rule.family, ...draft }));
}

const weight = (grade: Grade): number => GRADES.length - GRADES.indexOf(grade);

/**
 * Makes findings that follow from a constant already questioned into Notes that refer to it: a band that a contradicted
 * value leaves, a wave speed or ratio made of it. Only a question at least as heavy takes another one over.
 */
export function following(findings: readonly LooseFinding[]): LooseFinding[] {
  return findings.map((finding) => {
    const leader = leaderOf(finding, findings);
    if (leader === null) return finding;
    return { ...finding, grade: 'note', follows: leader };
  });
}

/** Families in the order in which one leads another. */
const LEADS = { geometry: 0, physics: 1, typical: 2, drawing: 3 } as const;

function leaderOf(finding: LooseFinding, all: readonly LooseFinding[]): FindingParameter | null {
  const { parameter } = finding;
  if (parameter === undefined || finding.family === 'drawing' || finding.family === 'geometry') return null;
  const parts: readonly FindingParameter[] = MADE_OF[parameter];
  const isOwnConstant = parts.length === 1;
  // What physics says of a constant itself stands, whatever else is wrong with it.
  if (finding.family === 'physics' && isOwnConstant) return null;
  for (const other of all) {
    if (other === finding || other.parameter === undefined) continue;
    if (weight(other.grade) < weight(finding.grade)) continue;
    const isPart = parts.includes(other.parameter);
    const leads = LEADS[other.family] < LEADS[finding.family];
    if (isPart && (leads || (!isOwnConstant && isSingle(other.parameter)))) return other.parameter;
    if (!isPart && other.parameter === parameter && leads) return other.parameter;
  }
  return impedanceLeader(finding, all);
}

/** Surge impedance and wave speed say one thing twice: of the two, the wave speed is the one that is asked about. */
function impedanceLeader(finding: LooseFinding, all: readonly LooseFinding[]): FindingParameter | null {
  if (finding.parameter !== 'surgeImpedanceOhm') return null;
  const speed = all.find(({ parameter }) => parameter === 'waveSpeed');
  return speed !== undefined && weight(speed.grade) >= weight(finding.grade) ? 'waveSpeed' : null;
}

function isSingle(parameter: FindingParameter): boolean {
  return MADE_OF[parameter].length === 1;
}
