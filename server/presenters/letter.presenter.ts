import type { ListedLetter } from '../repositories/letter-list.repository';
import type { PeopleById } from '../repositories/people-names.repository';
import { API_OPERATIONS, fillPath } from '../../shared/contracts/api-paths';
import type * as Api from '../../shared/contracts/api.generated';
import { instantOrNull, presentPerson } from './person.presenter';

export function presentLetter(
  letter: ListedLetter,
  discrepancies: readonly number[],
  people: PeopleById,
): Api.Letter {
  return {
    number: letter.number,
    applicationId: letter.applicationId,
    applicationNumber: letter.applicationNumber,
    applicationTitle: letter.applicationTitle,
    kind: letter.kind,
    subject: letter.subject,
    revision: letter.revision,
    sha256: letter.sha256,
    byteLength: letter.byteLength,
    sentAt: letter.sentAt.toISOString(),
    sentBy: presentPerson(people, letter.sentById ?? ''),
    dueAt: instantOrNull(letter.dueAt),
    discrepancies: [...discrepancies],
    href: fillPath(API_OPERATIONS.getLetter.path, {
      applicationId: letter.applicationNumber,
      number: letter.number,
    }),
  };
}
