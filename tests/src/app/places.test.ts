import { describe, expect, it } from 'vitest';
import { mayOpen } from '../../../src/app/may-open';
import { homeOf, PLACES } from '../../../src/app/places';
import { ROUTES } from '../../../src/app/route-table';
import type { Role, Session } from '../../../src/lib/api/session';

function sessionOf(role: Role): Session {
  return {
    user: { id: 'u1', name: 'A. Person', email: 'person@example.org' },
    role,
    organisation: { id: 'o1', name: 'Some Company', kind: role === 'applicant' ? 'applicant' : 'owner' },
    memberships: [],
    barredOrganisationIds: [],
    csrfToken: 'token',
    next: null,
    gridOwner: null,
    demo: false,
    setUpNeeded: false,
  };
}

const ROLES = ['applicant', 'reviewer', 'administrator'] as const;
const openTo = (path: string) =>
  ROUTES.filter((route) => route.path === path).flatMap((route) =>
    ROLES.filter((role) => mayOpen(sessionOf(role), route)),
  );

describe('places', () => {
  it.each(ROLES)('of the bar exist and open for the %s', (role) => {
    expect(PLACES[role].length).toBeGreaterThanOrEqual(3);
    expect(PLACES[role].length).toBeLessThanOrEqual(4);
    for (const place of PLACES[role]) expect(openTo(place.to)).toContain(role);
    expect(homeOf(role)).toBe(PLACES[role][0]?.to);
  });

  it('open by the policies: rules are edited, people managed and the trail read by administrators', () => {
    for (const path of ['/bands', '/people', '/record']) expect(openTo(path)).toEqual(['administrator']);
  });

  it('open by the policies: only applicants draft', () => {
    for (const path of [
      '/applications/new',
      '/applications/:number/edit',
      '/applications/:number/lines/:lineKey',
    ])
      expect(openTo(path)).toEqual(['applicant']);
  });

  it('keep the review sheet to the owner’s side', () => {
    expect(openTo('/applications/:number/review')).toEqual(['reviewer', 'administrator']);
  });
});
