/** What goes to a worker and what comes back: one question, one answer, joined by a number. */
export interface Question<In> {
  id: number;
  input: In;
}

export type Answer<Out> = { id: number; ok: true; output: Out } | { id: number; ok: false; message: string };

interface Waiting<Out> {
  resolve: (output: Out) => void;
  reject: (reason: Error) => void;
}

export interface WorkerCaller<In, Out> {
  ask: (input: In) => Promise<Out>;
  end: () => void;
}

/** Asks a worker, which is started with the first question; many questions may be under way. */
export function createWorkerCaller<In, Out>(start: () => Worker): WorkerCaller<In, Out> {
  let worker: Worker | null = null;
  let last = 0;
  const waiting = new Map<number, Waiting<Out>>();

  const failAll = (message: string) => {
    for (const { reject } of waiting.values()) reject(new Error(message));
    waiting.clear();
  };
  const end = () => {
    worker?.terminate();
    worker = null;
    failAll('The calculation was stopped.');
  };
  const started = () => {
    const fresh = start();
    fresh.addEventListener('message', ({ data }: MessageEvent<Answer<Out>>) => {
      const asker = waiting.get(data.id);
      waiting.delete(data.id);
      if (data.ok) asker?.resolve(data.output);
      else asker?.reject(new Error(data.message));
    });
    fresh.addEventListener('error', () => {
      failAll('The calculation could not be started in this browser.');
      fresh.terminate();
      worker = null;
    });
    return fresh;
  };

  return {
    ask: (input) =>
      new Promise<Out>((resolve, reject) => {
        worker ??= started();
        last += 1;
        waiting.set(last, { resolve, reject });
        worker.postMessage({ id: last, input } satisfies Question<In>);
      }),
    end,
  };
}

/** The worker's side: answers each question with what `work` makes of it. */
export function answerQuestions<In, Out>(work: (input: In) => Out): void {
  self.addEventListener('message', ({ data }: MessageEvent<Question<In>>) => {
    const { id, input } = data;
    try {
      self.postMessage({ id, ok: true, output: work(input) } satisfies Answer<Out>);
    } catch (error) {
      const message = error instanceof Error ? error.message : String(error);
      self.postMessage({ id, ok: false, message } satisfies Answer<Out>);
    }
  });
}
