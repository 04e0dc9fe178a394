import type { Discrepancy } from '#shared/contracts/api.generated';

export interface ReplyAct {
  act: 'remark' | 'settle' | 'reopen';
  label: string;
  primary: boolean;
  /** Cannot be done without words. */
  needsWords: boolean;
}

const REMARK: ReplyAct = { act: 'remark', label: 'Add to the thread', primary: false, needsWords: true };

/** What a reviewer can do with a discrepancy in each of its states; the likeliest first. */
const ACTS: Readonly<Record<Discrepancy['state'], readonly ReplyAct[]>> = {
  open: [
    { ...REMARK, primary: true },
    { act: 'settle', label: 'Settle without an answer', primary: false, needsWords: false },
  ],
  answered: [
    { act: 'reopen', label: 'Ask again', primary: true, needsWords: true },
    { act: 'settle', label: 'Accept the answer', primary: false, needsWords: false },
    REMARK,
  ],
  settled: [{ act: 'reopen', label: 'Reopen', primary: false, needsWords: true }, REMARK],
  waived: [{ act: 'reopen', label: 'Reopen', primary: false, needsWords: true }, REMARK],
};

/** The acts that stand under a thread. */
export const replyActs = (state: Discrepancy['state']): readonly ReplyAct[] => ACTS[state];
