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
  /** Asks for a line, written as JSON. */
  ask: (content: string) => void;
  end: () => void;
}

interface Answered {
  /** The line that the outcome is of. */
  content: string | null;
  outcome: CheckOutcome | null;
  failed: boolean;
}

type Content = [line: Record<string, unknown>, written: Readonly<Record<string, string>>];

/** One worker for the page: it is asked for the latest text only, and older answers are left aside. */
function startChecker(
  basis: CheckBasis,
  onOutcome: (content: string, outcome: CheckOutcome) => void,
  onFailure: () => void,
): Checker {
  const worker = new Worker(new URL('../worker/live-check.worker.ts', import.meta.url), { type: 'module' });
  const post = (message: ToWorker) => worker.postMessage(message);
  let last = { id: 0, content: '' };
  worker.addEventListener('message', ({ data }: MessageEvent<FromWorker>) => {
    if (data.id === last.id) onOutcome(last.content, data.outcome);
  });
  worker.addEventListener('error', onFailure);
  post({ kind: 'basis', basis });
  return {
    ask: (content) => {
      last = { id: last.id + 1, content };
      const [line, written] = JSON.parse(content) as Content;
      post({ kind: 'check', question: { id: last.id, line, written } });
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
  const [answered, setAnswered] = useState<Answered>({ content: null, outcome: null, failed: false });
  const content = JSON.stringify([line, written] satisfies Content);

  useEffect(() => {
    const started = startChecker(
      basis,
      (of, outcome) => setAnswered({ content: of, outcome, failed: false }),
      () => setAnswered((before) => ({ ...before, failed: true })),
    );
    checker.current = started;
    return () => started.end();
  }, [basis]);

  useEffect(() => {
    const timer = setTimeout(() => checker.current?.ask(content), DELAY_MS);
    return () => clearTimeout(timer);
  }, [content, basis]);

  const { outcome, failed } = answered;
  return { outcome, pending: !failed && answered.content !== content, failed };
}
