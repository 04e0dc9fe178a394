import type { Application } from '../entities/case.entities';
import type { LinkedAttachment } from '../repositories/attachment.repository';
import type { PeopleById } from '../repositories/people-names.repository';
import { API_OPERATIONS, fillPath } from '../../shared/contracts/api-paths';
import type * as Api from '../../shared/contracts/api.generated';
import { presentPerson } from './person.presenter';

export function presentAttachment(
  { attachment, link }: LinkedAttachment,
  application: Pick<Application, 'number'>,
  names: { people: PeopleById; numbers: ReadonlyMap<string, number> },
): Api.Attachment {
  return {
    id: attachment.id,
    fileName: attachment.name,
    mediaType: attachment.mediaType,
    byteLength: attachment.byteLength,
    sha256: attachment.sha256,
    subject: {
      kind: link.subject,
      lineKey: link.lineKey,
      discrepancy: names.numbers.get(link.discrepancyId ?? '') ?? null,
    },
    uploadedBy: presentPerson(names.people, attachment.uploadedBy),
    uploadedAt: attachment.uploadedAt.toISOString(),
    href: fillPath(API_OPERATIONS.getAttachment.path, {
      applicationId: application.number,
      attachmentId: attachment.id,
    }),
  };
}
