import { Piscina } from 'piscina';
import type { CheckReport } from '../../shared/checks/types';
import type { RuleSet } from '../../shared/checks/rule-set';
import type { NormalisedFiling } from '../../shared/filing/types';

export interface CheckTask {
  filing: NormalisedFiling;
  rules: RuleSet;
}

/** Runs the check of a whole filing away from the thread that answers requests. */
export interface Checker {
  check(task: CheckTask, signal?: AbortSignal): Promise<CheckReport>;
  close(): Promise<void>;
}

/** Worker threads; `base` is the address of the entry that runs, since a bundler moves this module. */
export function makeChecker(base: string, threads = 1): Checker {
  const fromSource = base.endsWith('.ts');
  const worker = new URL(fromSource ? './workers/check.worker.ts' : './workers/check.worker.js', base);
  const pool = new Piscina<CheckTask, CheckReport>({
    filename: worker.href,
    minThreads: 0,
    maxThreads: threads,
    idleTimeout: 30_000,
    execArgv: fromSource ? ['--import', 'tsx'] : [],
  });
  return {
    check: (task, signal) => pool.run(task, { signal }),
    close: () => pool.destroy(),
  };
}
