/** What steps need: each need looks at the facts and answers with what is lacking, as a sentence, or with nothing. */
import type { CaseFacts } from './case-facts';

/** What is lacking: the kind of refusal and the sentence. */
export interface Lack {
  refusal: 'taken' | 'check-running' | 'needs';
  reason: string;
}

/**
 * A need of a step: facts, who asks, and the step's word at the head of the sentence; null when it is met.
 */
export type Need = (facts: CaseFacts, actor: { userId: string }, words: string) => Lack | null;

const lack = (reason: string, refusal: Lack['refusal'] = 'needs'): Lack => ({ refusal, reason });

/**
 * Names discrepancies in a sentence.
 * @param numbers their numbers
 * @returns "D-1", "D-1 and D-2", "D-1, D-2 and D-3"
 */
export function nameDiscrepancies(numbers: readonly number[]): string {
  return joinWords(numbers.map((n) => `D-${n}`));
}

/**
 * Joins words as a sentence does.
 * @param words the words
 * @returns "a", "a and b", "a, b and c"
 */
export function joinWords(words: readonly string[]): string {
  const last = words.at(-1) ?? '';
  return words.length < 2 ? last : `${words.slice(0, -1).join(', ')} and ${last}`;
}

const isOrAre = (count: number) => (count === 1 ? 'is' : 'are');

/** The draft has lines, each complete by schema and with geometry that can be computed. */
export const isComplete: Need = ({ draft }, _, words) => {
  if (draft.lineCount === 0) return lack(`${words} opens once the draft has a line.`);
  const { length } = draft.faultyLines;
  if (length === 0) return null;
  return lack(`${words} opens once ${nameSome(draft.faultyLines)} ${isOrAre(length)} complete.`);
};

/** The first three, and how many more there are. */
function nameSome(names: readonly string[]): string {
  const shown = names.slice(0, 3);
  const more = names.length - shown.length;
  return joinWords(more > 0 ? [...shown, `${more} more`] : shown);
}

/** Each open discrepancy is answered by a change or an explanation; a change has to be there. */
export const allAnswered: Need = ({ discrepancies, draft }, _, words) => {
  const open = discrepancies.filter((d) => d.state === 'open').map((d) => d.number);
  if (open.length > 0) {
    return lack(`${words} opens once ${nameDiscrepancies(open)} ${isOrAre(open.length)} answered.`);
  }
  const byChange = discrepancies.filter((d) => d.state === 'answered' && d.answeredBy === 'change');
  if (byChange.length > 0 && draft.unchanged) {
    const names = nameDiscrepancies(byChange.map((d) => d.number));
    return lack(`${words} opens once the draft has the change that answers ${names}.`);
  }
  return null;
};

/** Nobody has the case yet. */
export const isNobodys: Need = ({ reviewerId, reviewerName }) =>
  reviewerId === null ? null : lack(`${reviewerName ?? 'Somebody else'} has it already.`, 'taken');

/** Who asks is the case's reviewer. */
export const isCaseReviewer: Need = ({ reviewerId, reviewerName }, { userId }, words) => {
  if (reviewerId === userId) return null;
  return lack(`${words} is for the case’s reviewer${reviewerName === null ? '' : `, ${reviewerName}`}.`);
};

/** Who asks is the case's reviewer, or that one is gone: then any reviewer takes care that the case goes on. */
export const mayPassItOn: Need = (facts, actor, words) =>
  facts.isReviewerGone === true ? null : isCaseReviewer(facts, actor, words);

/** The governing check has ended well. */
export const runIsDone: Need = ({ run }, _, words) => {
  if (run?.state === 'done') return null;
  if (run?.state === 'failed')
    return lack(`${words} opens once the check, which failed, has been made again.`);
  const progress = run === null ? '' : `: ${run.linesChecked} of ${run.lineCount} lines so far`;
  return lack(`${words} opens once the check is done${progress}.`, 'check-running');
};

/** No proposal waits for a second reviewer's word. */
export const noProposalWaits: Need = ({ pendingCountersigns }, _, words) => {
  const [first] = pendingCountersigns;
  if (first === undefined) return null;
  const what = first.subject === 'decline' ? 'the proposal to decline' : 'the proposed waiver';
  return lack(`${words} opens once a second reviewer has decided on ${what}.`);
};

/** There is something to return for. */
export const hasOpenDiscrepancy: Need = ({ discrepancies }, _, words) =>
  discrepancies.some((d) => d.state === 'open') ? null : lack(`${words} opens once a discrepancy is open.`);

/** Every discrepancy is settled or waived. */
export const allSettled: Need = ({ discrepancies }, _, words) => {
  const left = discrepancies.filter((d) => d.state === 'open' || d.state === 'answered').map((d) => d.number);
  if (left.length === 0) return null;
  return lack(`${words} opens once ${nameDiscrepancies(left)} ${isOrAre(left.length)} settled.`);
};

/** Every Must answer of the current revision is settled or waived. */
export const allMustAnswersDone: Need = ({ openMustAnswers }, _, words) => {
  if (openMustAnswers.length === 0) return null;
  const names = nameSome(openMustAnswers);
  return lack(`${words} opens once ${names} ${isOrAre(openMustAnswers.length)} settled or waived.`);
};
