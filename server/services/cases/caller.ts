import type { UserActor } from '../../database/actor';
import type { Transaction } from '../../database/transaction';
import type { AppAbility } from '../../../shared/policies/subjects';
import type { Sight } from '../../repositories/overview.repository';

/** Who asks, what they may do, and the transaction that their request runs in. */
export interface Caller {
  tx: Transaction;
  actor: UserActor;
  ability: AppAbility;
}

/** Applicants see their drafts; the owner's people see what was ever filed. */
export function sightOf(actor: UserActor): Sight {
  return actor.role === 'applicant' ? 'drafts' : 'filed';
}
