/** What the rules of the workflow have to know of a case; the server gathers it, the rules decide. */
import type { State } from './states';

/** State of a discrepancy. */
export type DiscrepancyState = 'open' | 'answered' | 'settled' | 'waived';

/** State of the check run that governs the current revision. */
export type RunState = 'queued' | 'running' | 'done' | 'failed';

/** A case as the rules see it. */
export interface CaseFacts {
  state: State;
  /** True for Draft, Filed, In review, Returned. */
  isRoundOpen: boolean;
  hasAcceptedRecord: boolean;
  reviewerId: string | null;
  reviewerName: string | null;
  /** The case's reviewer cannot see it any more: has left, is shut out, or is barred from the applicant. */
  isReviewerGone?: boolean;
  draft: {
    lineCount: number;
    /** Keys of lines with faults by schema, or with geometry that cannot be computed. */
    faultyLines: readonly string[];
    /** The draft's lines equal those of the revision that was returned. */
    unchanged: boolean;
  };
  /** Governing run of the current revision; null before the first filing. */
  run: { state: RunState; linesChecked: number; lineCount: number } | null;
  discrepancies: readonly {
    number: number;
    state: DiscrepancyState;
    /** How it was answered, if it was. */
    answeredBy: 'change' | 'explanation' | null;
  }[];
  /** Must-answer findings of the current revision that are neither settled nor waived: "X1 of L1". */
  openMustAnswers: readonly string[];
  /** Proposals on the current revision that wait for a second reviewer. */
  pendingCountersigns: readonly { subject: 'waive' | 'decline' }[];
}
