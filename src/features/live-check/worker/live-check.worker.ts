import { checkDraftLine } from './check-line';
import type { CheckBasis, FromWorker, ToWorker } from './messages';

/** Checks beside the page's own thread, so that typing never waits for it. */
let basis: CheckBasis | null = null;

self.addEventListener('message', ({ data }: MessageEvent<ToWorker>) => {
  if (data.kind === 'basis') {
    basis = data.basis;
    return;
  }
  if (!basis) return;
  const answer: FromWorker = { id: data.question.id, outcome: checkDraftLine(data.question, basis) };
  self.postMessage(answer);
});
