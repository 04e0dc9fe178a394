import type { Role } from '../lib/api/session';

export interface Place {
  label: string;
  to: string;
  /** Addresses elsewhere that belong to the place. */
  holds?: RegExp;
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
    { label: 'Queue', to: '/queue', holds: /^\/applications\/[^/]+\/(review|compare|record)$/ },
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

/** The place that an address belongs to: the one that claims it, else the one whose address begins it. */
export function placeOf(places: readonly Place[], pathname: string): Place | undefined {
  return (
    places.find((place) => place.holds?.test(pathname)) ??
    places.find((place) => pathname === place.to || pathname.startsWith(`${place.to}/`))
  );
}
