import type { Action, AppAbility, SubjectRecord } from '../../shared/policies/subjects';
import { forbidden } from '../errors/problem';

/** Throws `forbidden` unless the ability allows the action on this very record. Read it under the ability first. */
export function authorize(ability: AppAbility, action: Action, record: SubjectRecord, why?: string): void {
  if (!ability.can(action, record)) throw forbidden(why);
}
