import { checkFiling } from '../../shared/checks/check-filing';
import type { CheckTask } from '../integrations/checker';

/** The entry of a worker thread: one whole filing in, its report out. */
export default function check({ filing, rules }: CheckTask) {
  return checkFiling(filing, rules, {});
}
