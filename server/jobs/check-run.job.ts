import type { Surroundings } from '../integrations/surroundings';
import { runCheck } from '../services/filing/run-check';

/** Checks a filed revision; the id is the run's. */
export function checkRunJob(surroundings: Surroundings, runId: string): Promise<unknown> {
  return runCheck(surroundings, runId);
}
