import { defineAbility } from '#shared/policies/ability';
import { actorOf } from '../lib/ability/actor';
import type { Session } from '../lib/api/session';
import type { RouteEntry } from './route-table';

/** Whether a page is there for this person: by the policies, and by the side of the case that it is made for. */
export function mayOpen(session: Session, { roles, needs }: Pick<RouteEntry, 'roles' | 'needs'>): boolean {
  if (roles && !roles.includes(session.role)) return false;
  return !needs || defineAbility(actorOf(session)).can(...needs);
}
