import { useEffect, useRef, useState } from 'react';
import type { CheckBasis, CheckOutcome, FromWorker, ToWorker } from '../worker/messages';

/** The last outcome, whether a newer one is on its way, and whether checking failed altogether. */
export interface LiveCheck {
  outcome: CheckOutcome | null;
  pending: boolean;
  failed: boolean;
}

/** How long the typing must pause before a check begins. */
const DELAY_MS = 120;

interface Checker {
  ask: (question: { line: Record<string, unknown>; written: Readonly<Record<string, string>> }) => void;
  end: () => void;
}

/** One worker for the page: it is asked for the latest text only, and older answers are left aside. */
function startChecker(
  basis: CheckBasis,
  onOutcome: (o: CheckOutcome) => void,
  onFailure: () => void,
): Checker {
  const worker = new Worker(new URL('../worker/live-check.worker.ts', import.meta.url), { type: 'module' });
  const post = (message: ToWorker) => worker.postMessage(message);
  let last = 0;
  worker.addEventListener('message', ({ data }: MessageEvent<FromWorker>) => {
    if (data.id === last) onOutcome(data.outcome);
  });
  worker.addEventListener('error', onFailure);
  post({ kind: 'basis', basis });
  return {
    ask: (question) => {
      last += 1;
      post({ kind: 'check', question: { id: last, ...question } });
    },
    end: () => worker.terminate(),
  };
}

/** Checks a line a moment after each change, by the server's own code, in a worker. */
export function useLiveCheck(
  line: Record<string, unknown>,
  written: Readonly<Record<string, string>>,
  basis: CheckBasis,
): LiveCheck {
  const checker = useRef<Checker | null>(null);
  const [state, setState] = useState<LiveCheck>({ outcome: null, pending: true, failed: false });
  const content = JSON.stringify([line, written]);

  useEffect(() => {
    const started = startChecker(
      basis,
      (outcome) => setState({ outcome, pending: false, failed: false }),
      () => setState((before) => ({ ...before, pending: false, failed: true })),
    );
    checker.current = started;
    return () => started.end();
  }, [basis]);

  useEffect(() => {
    setState((before) => (before.pending ? before : { ...before, pending: true }));
    const timer = setTimeout(() => {
      const [askedLine, askedWritten] = JSON.parse(content) as [typeof line, typeof written];
      checker.current?.ask({ line: askedLine, written: askedWritten });
    }, DELAY_MS);
    return () => clearTimeout(timer);
  }, [content, basis]);

  return state;
}
