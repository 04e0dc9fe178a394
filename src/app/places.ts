import type { Role } from '../lib/api/session';

export interface Place {
  label: string;
  to: string;
}

/** The three or four places of each role, in the order of the bar. The first is where a sign-in leads. */
export const PLACES: Readonly<Record<Role, readonly Place[]>> = {
  applicant: [
    { label: 'Applications', to: '/applications' },
    { label: 'Lines', to: '/lines' },
    { label: 'Letters', to: '/letters' },
    { label: 'Rules', to: '/rules' },
  ],
  reviewer: [
    { label: 'Queue', to: '/queue' },
    { label: 'Applications', to: '/applications' },
    { label: 'Lines', to: '/lines' },
    { label: 'Letters', to: '/letters' },
  ],
  administrator: [
    { label: 'Bands', to: '/bands' },
    { label: 'Rules', to: '/rules' },
    { label: 'People', to: '/people' },
    { label: 'Record', to: '/record' },
  ],
};

/** Where a person of this role begins. */
export function homeOf(role: Role): string {
  return PLACES[role][0]?.to ?? '/applications';
}
