/**
 * The case's state machine as data: who may take which step from which state, what it leads to, what it needs, and
 * what it does to the windows. Refusals are sentences that say what opens the step.
 */
import type { CaseFacts } from './case-facts';
import {
  allAnswered,
  allMustAnswersDone,
  allSettled,
  hasOpenDiscrepancy,
  isComplete,
  isCaseReviewer,
  isNobodys,
  mayPassItOn,
  noProposalWaits,
  runIsDone,
  type Need,
} from './needs';
import type { State } from './states';
import type { WindowKind } from './windows';

/** Every step that a button stands for. */
export const STEPS = [
  'file',
  'take',
  'hand-over',
  'put-back',
  'return',
  'raise',
  'settle',
  'waive',
  'accept',
  'decline',
  'withdraw',
  'amend',
] as const;

/** A step of the case. */
export type Step = (typeof STEPS)[number];

/** Roles that a member of an organisation has. */
export type Role = 'applicant' | 'reviewer' | 'administrator';

/** One way from a state to another. */
export interface Transition {
  from: State;
  to: State;
  /** Windows that it closes. */
  closes: readonly WindowKind[];
  /** Window that it opens. */
  opens: WindowKind | null;
}

/** A step with all that governs it. */
export interface StepRule {
  /** As buttons and sentences name it. */
  words: string;
  role: Role;
  transitions: readonly Transition[];
  needs: readonly Need[];
  /** Has to be told why. */
  reason: boolean;
  /** A second reviewer has to agree before it takes effect. */
  countersigned: boolean;
}

const go = (from: State, to: State, closes: readonly WindowKind[], opens: WindowKind | null): Transition => ({
  from,
  to,
  closes,
  opens,
});

/** Steps of the review that leave the state as it is. */
const stay = go('in-review', 'in-review', [], null);

/** The table of steps. */
export const STEP_RULES: Readonly<Record<Step, StepRule>> = {
  file: {
    words: 'File',
    role: 'applicant',
    transitions: [go('draft', 'filed', [], 'take-up'), go('returned', 'in-review', ['cure'], 'review')],
    needs: [isComplete, allAnswered],
    reason: false,
    countersigned: false,
  },
  take: {
    words: 'Take',
    role: 'reviewer',
    transitions: [go('filed', 'in-review', ['take-up'], 'review')],
    needs: [isNobodys, runIsDone],
    reason: false,
    countersigned: false,
  },
  'hand-over': {
    words: 'Hand over',
    role: 'reviewer',
    transitions: [stay],
    needs: [mayPassItOn],
    reason: true,
    countersigned: false,
  },
  'put-back': {
    words: 'Put back',
    role: 'reviewer',
    transitions: [go('in-review', 'filed', ['review'], 'take-up')],
    needs: [mayPassItOn],
    reason: true,
    countersigned: false,
  },
  return: {
    words: 'Return',
    role: 'reviewer',
    transitions: [go('in-review', 'returned', ['review'], 'cure')],
    needs: [isCaseReviewer, runIsDone, noProposalWaits, hasOpenDiscrepancy],
    reason: false,
    countersigned: false,
  },
  raise: {
    words: 'Raise a discrepancy',
    role: 'reviewer',
    transitions: [stay],
    needs: [isCaseReviewer, runIsDone],
    reason: false,
    countersigned: false,
  },
  settle: {
    words: 'Settle',
    role: 'reviewer',
    transitions: [stay],
    needs: [isCaseReviewer, runIsDone],
    reason: false,
    countersigned: false,
  },
  waive: {
    words: 'Waive',
    role: 'reviewer',
    transitions: [stay],
    needs: [isCaseReviewer, runIsDone],
    reason: true,
    countersigned: false,
  },
  accept: {
    words: 'Accept',
    role: 'reviewer',
    transitions: [go('in-review', 'accepted', ['review'], null)],
    needs: [isCaseReviewer, runIsDone, noProposalWaits, allSettled, allMustAnswersDone],
    reason: false,
    countersigned: false,
  },
  decline: {
    words: 'Decline',
    role: 'reviewer',
    transitions: [go('in-review', 'declined', ['review'], null)],
    needs: [isCaseReviewer, noProposalWaits],
    reason: true,
    countersigned: true,
  },
  withdraw: {
    words: 'Withdraw',
    role: 'applicant',
    transitions: [
      go('draft', 'withdrawn', [], null),
      go('filed', 'withdrawn', ['take-up'], null),
      go('in-review', 'withdrawn', ['review'], null),
      go('returned', 'withdrawn', ['cure'], null),
    ],
    needs: [],
    reason: false,
    countersigned: false,
  },
  amend: {
    words: 'Amend',
    role: 'applicant',
    transitions: [go('accepted', 'draft', [], null)],
    needs: [],
    reason: true,
    countersigned: false,
  },
};

/** An answer to "may this step be taken?". */
export type StepAnswer =
  | { open: true; transition: Transition }
  | { open: false; refusal: 'role' | 'state' | 'taken' | 'check-running' | 'needs'; reason: string };

/**
 * Decides whether a step may be taken.
 * @param step the step
 * @param facts what is known of the case
 * @param actor who asks: role and user
 * @returns the transition to make, or the first thing that stands in the way, as a sentence for people
 */
export function checkStep(step: Step, facts: CaseFacts, actor: { role: Role; userId: string }): StepAnswer {
  const rule = STEP_RULES[step];
  if (actor.role !== rule.role) {
    return { open: false, refusal: 'role', reason: `${rule.words} is for ${ROLE_WORDS[rule.role]}.` };
  }
  const transition = transitionOf(step, facts);
  if (transition === undefined) return refuseState(step, facts);
  for (const need of rule.needs) {
    const lack = need(facts, actor, rule.words);
    if (lack !== null) return { open: false, ...lack };
  }
  return { open: true, transition };
}

/** After a declined or withdrawn amendment the accepted record still stands, so it can be amended again. */
function transitionOf(step: Step, facts: CaseFacts): Transition | undefined {
  const from = step === 'amend' && facts.hasAcceptedRecord && !facts.isRoundOpen ? 'accepted' : facts.state;
  return STEP_RULES[step].transitions.find((t) => t.from === from);
}

function refuseState(step: Step, facts: CaseFacts): StepAnswer {
  const { words } = STEP_RULES[step];
  if (step === 'take' && facts.reviewerId !== null) {
    return {
      open: false,
      refusal: 'taken',
      reason: `${facts.reviewerName ?? 'Somebody else'} has it already.`,
    };
  }
  return { open: false, refusal: 'state', reason: `${words} ${CLOSED_WORDS[facts.state]}.` };
}

const ROLE_WORDS: Readonly<Record<Role, string>> = {
  applicant: 'the applicant',
  reviewer: 'reviewers of the grid owner',
  administrator: 'administrators of the grid owner',
};

/** How a sentence goes on that says why a step is closed in a state. */
const CLOSED_WORDS: Readonly<Record<State, string>> = {
  draft: 'opens once the applicant has filed',
  filed: 'opens once a reviewer has taken the case',
  'in-review': 'is closed while the case is in review',
  returned: 'opens once the applicant has filed again',
  accepted: 'is closed: the application is accepted',
  declined: 'is closed: the application is declined',
  withdrawn: 'is closed: the application is withdrawn',
};
