import type { PeopleById } from '../repositories/people-names.repository';
import type { Person } from '../../shared/contracts/api.generated';

/** Somebody as others see them: a name and an id, never an address. */
export function presentPerson(people: PeopleById, id: string): Person {
  return { id, name: people.get(id)?.name ?? 'Somebody' };
}

export function presentPersonOrNull(people: PeopleById, id: string | null): Person | null {
  return id === null ? null : presentPerson(people, id);
}

export function instantOrNull(instant: Date | null): string | null {
  return instant === null ? null : instant.toISOString();
}
