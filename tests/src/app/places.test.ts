import { describe, expect, it } from 'vitest';
import { placeOf, PLACES } from '../../../src/app/places';

describe('the current place', () => {
  it.each([
    ['reviewer', '/queue', 'Queue'],
    ['reviewer', '/applications/27-0418/review', 'Queue'],
    ['reviewer', '/applications/27-0418/record', 'Queue'],
    ['reviewer', '/applications', 'Applications'],
    ['applicant', '/applications/27-0418/lines/L1', 'Applications'],
    ['administrator', '/rules', 'Rules'],
    ['administrator', '/applications/27-0418/review', undefined],
    ['reviewer', '/rules', undefined],
  ] as const)('of a %s at %s is %s', (role, path, label) => {
    expect(placeOf(PLACES[role], path)?.label).toBe(label);
  });
});
