import type { CircuitContext, LineContext, PairContext } from '../context';
import type { FindingParameter } from '../parameters';
import type { Family, Finding, Grade } from '../types';

/** What a rule says of a finding; code, family, group and causes are added by the check. */
export type FindingDraft = Omit<Finding, 'code' | 'family' | 'group' | 'causes' | 'follows'>;

/** What is printed of a rule. */
export interface RuleFacts {
  /** Stable code, family first. */
  code: string;
  family: Family;
  /** The grades that it can give, heaviest first. */
  grades: readonly Grade[];
  parameter: FindingParameter | null;
  /** What must be filed for it to be weighed. */
  needs: string;
  /** What it holds, in one sentence. */
  sentence: string;
  /** Where it comes from. */
  source: string;
}

/** A rule weighed once a circuit. */
export interface CircuitRule extends RuleFacts {
  on: 'circuit';
  apply: (context: CircuitContext) => FindingDraft[];
}

/** A rule weighed once a pair of circuits whose coupling is declared. */
export interface PairRule extends RuleFacts {
  on: 'pair';
  apply: (context: PairContext) => FindingDraft[];
}

/** A rule weighed once a line. */
export interface LineRule extends RuleFacts {
  on: 'line';
  apply: (context: LineContext) => FindingDraft[];
}

/** Any rule. */
export type Rule = CircuitRule | PairRule | LineRule;

/** The JSON Pointer of a declared constant, or of the circuit's entry when it is not declared. */
export function pointerOf(context: CircuitContext, parameter: keyof CircuitContext['declared']): string {
  return context.circuit.declared[parameter]?.pointer ?? context.circuit.pointer;
}
