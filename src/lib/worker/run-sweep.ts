import type { OverheadSection, Result, SweepTable } from '#shared/engine/index';
import { createWorkerCaller } from './worker-call';

export interface SweepInput {
  section: OverheadSection;
  lowHz: number;
  highHz: number;
  points: number;
}

export type SweepAnswer = { ok: true; table: SweepTable } | Extract<Result<never>, { ok: false }>;

const caller = createWorkerCaller<SweepInput, SweepAnswer>(
  () => new Worker(new URL('./sweep.worker.ts', import.meta.url), { type: 'module' }),
);

/**
 * R, L and B of a section over a logarithmic grid of frequencies, computed beside the page's own thread,
 * with skin effect wherever the conductors' data allow it.
 */
export function runSweep(input: SweepInput): Promise<SweepAnswer> {
  return caller.ask(input);
}
