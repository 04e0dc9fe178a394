import type { QueryDeepPartialEntity } from 'typeorm';
import { conditionalUpdate } from '../../database/conditional-update';
import { Round } from '../../entities/case.entities';
import { conflict, forbidden, Problem, stale } from '../../errors/problem';
import { touchApplication } from '../../repositories/application.repository';
import type { CaseFacts } from '../../../shared/workflow/case-facts';
import { STATE_WORDS } from '../../../shared/workflow/states';
import { checkStep, type Step, type Transition } from '../../../shared/workflow/steps';
import { changeWindows } from '../windows/change-windows';
import type { Caller } from './caller';
import type { CaseFile } from './case-file';

/** The transition of a step, or the refusal that says what opens it. */
export function requireStep({ actor }: Caller, step: Step, facts: CaseFacts): Transition {
  const answer = checkStep(step, facts, actor);
  if (answer.open) return answer.transition;
  if (answer.refusal === 'role') throw forbidden(answer.reason);
  if (answer.refusal === 'taken') throw new Problem('already-taken', { detail: answer.reason });
  if (answer.refusal === 'check-running') throw new Problem('check-running', { detail: answer.reason });
  throw conflict(answer.reason, { state: facts.state });
}

/** Refuses a write on a version that no longer holds. */
export function requireVersion({ round }: CaseFile, version: number | undefined): void {
  if (version === undefined || version === round.version) return;
  throw stale('The application was moved by somebody else since you last saw it.', {
    currentVersion: round.version,
    changed: [`It is ${STATE_WORDS[round.state]} now.`],
  });
}

/** Moves the round as a transition says: state, windows and what else the step changes, all or nothing. */
export async function moveRound(
  { tx }: Caller,
  file: CaseFile,
  transition: Transition,
  changes: QueryDeepPartialEntity<Round> = {},
): Promise<void> {
  const { round } = file;
  await conditionalUpdate(
    tx.manager,
    Round,
    {
      id: round.id,
      version: round.version,
      state: transition.from === round.state ? round.state : transition.from,
    },
    { ...(changes as Partial<Round>), state: transition.to },
  );
  await changeWindows(tx, file, transition);
  await touchApplication(tx.manager, file.application.id, tx.now);
}
