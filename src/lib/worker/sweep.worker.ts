import { logarithmicGrid, sweep } from '#shared/engine/index';
import type { SweepAnswer, SweepInput } from './run-sweep';
import { answerQuestions } from './worker-call';

answerQuestions<SweepInput, SweepAnswer>(({ section, lowHz, highHz, points }) => {
  const result = sweep(section, logarithmicGrid(lowHz, highHz, points), true);
  return result.ok ? { ok: true, table: result.value } : result;
});
