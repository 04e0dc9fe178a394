/** What may be done with a discrepancy, and what it becomes. */
import type { CaseFacts, DiscrepancyState } from './case-facts';
import type { State } from './states';

/** What people do with a discrepancy. */
export type DiscrepancyStep = 'answer' | 'settle' | 'reopen' | 'waive' | 'remark';

interface DiscrepancyRule {
  role: 'applicant' | 'reviewer' | 'both';
  /** States of the round in which it may be done. */
  rounds: readonly State[];
  from: readonly DiscrepancyState[];
  /** Null leaves the state as it is. */
  to: DiscrepancyState | null;
}

/** The table of a discrepancy's steps. An answered one may be answered again until the applicant files. */
export const DISCREPANCY_RULES: Readonly<Record<DiscrepancyStep, DiscrepancyRule>> = {
  answer: { role: 'applicant', rounds: ['returned'], from: ['open', 'answered'], to: 'answered' },
  settle: { role: 'reviewer', rounds: ['in-review'], from: ['open', 'answered'], to: 'settled' },
  reopen: { role: 'reviewer', rounds: ['in-review'], from: ['answered', 'settled', 'waived'], to: 'open' },
  waive: { role: 'reviewer', rounds: ['in-review'], from: ['open', 'answered'], to: 'waived' },
  remark: {
    role: 'both',
    rounds: ['in-review', 'returned'],
    from: ['open', 'answered', 'settled', 'waived'],
    to: null,
  },
};

/** An answer to "may this be done with the discrepancy?". */
export type DiscrepancyAnswer =
  { open: true; to: DiscrepancyState } | { open: false; refusal: 'role' | 'state'; reason: string };

const STATE_OF_IT: Readonly<Record<DiscrepancyState, string>> = {
  open: 'still open',
  answered: 'answered already',
  settled: 'settled already',
  waived: 'waived already',
};

/**
 * Decides whether something may be done with a discrepancy.
 * @param step what is to be done
 * @param discrepancy its number and state
 * @param facts the case
 * @param role role of who asks
 * @returns the state that it gets, or why not, as a sentence
 */
export function checkDiscrepancyStep(
  step: DiscrepancyStep,
  discrepancy: { number: number; state: DiscrepancyState },
  facts: Pick<CaseFacts, 'state'>,
  role: string,
): DiscrepancyAnswer {
  const rule = DISCREPANCY_RULES[step];
  const name = `D-${discrepancy.number}`;
  if (rule.role === 'both' ? role === 'administrator' : role !== rule.role) {
    const whose = rule.role === 'applicant' ? 'the applicant’s' : 'the reviewer’s';
    return { open: false, refusal: 'role', reason: `${name} is ${whose} to ${step}.` };
  }
  if (!rule.rounds.includes(facts.state)) {
    const when = step === 'answer' ? 'once the case is returned' : 'while the case is in review';
    return { open: false, refusal: 'state', reason: `${name} can be dealt with so only ${when}.` };
  }
  if (!rule.from.includes(discrepancy.state)) {
    return { open: false, refusal: 'state', reason: `${name} is ${STATE_OF_IT[discrepancy.state]}.` };
  }
  return { open: true, to: rule.to ?? discrepancy.state };
}
