import type { EntityManager, QueryDeepPartialEntity } from 'typeorm';
import { Attachment, AttachmentChunk, AttachmentLink } from '../entities/file.entities';
import { accessibleBy } from '../policies/accessible-by';
import type { AppAbility } from '../../shared/policies/subjects';

/** An attachment and what it hangs on. */
export interface LinkedAttachment {
  attachment: Attachment;
  link: AttachmentLink;
}

const CHUNK_BYTES = 1024 * 1024;

/** Attachments of an application, newest first. */
export async function listAttachments(
  manager: EntityManager,
  ability: AppAbility,
  applicationId: string,
): Promise<LinkedAttachment[]> {
  const links = await manager.find(AttachmentLink, {
    where: { applicationId },
    order: { linkedAt: 'DESC' },
  });
  if (links.length === 0) return [];
  const query = manager
    .createQueryBuilder(Attachment, 'attachment')
    .where('attachment.id IN (:...ids)', { ids: links.map((link) => link.attachmentId) });
  const rows = await accessibleBy(query, ability, 'read', 'Attachment').getMany();
  const byId = new Map(rows.map((row) => [row.id, row]));
  return links.flatMap((link) => {
    const attachment = byId.get(link.attachmentId);
    return attachment === undefined ? [] : [{ attachment, link }];
  });
}

export async function findAttachment(
  manager: EntityManager,
  ability: AppAbility,
  applicationId: string,
  id: string,
): Promise<Attachment | null> {
  if (!(await manager.existsBy(AttachmentLink, { applicationId, attachmentId: id }))) return null;
  const query = manager.createQueryBuilder(Attachment, 'attachment').where('attachment.id = :id', { id });
  return accessibleBy(query, ability, 'read', 'Attachment').getOne();
}

export async function insertAttachment(
  manager: EntityManager,
  values: QueryDeepPartialEntity<Attachment> & { orgId: string },
  bytes: Buffer,
): Promise<string> {
  const result = await manager.insert(Attachment, values);
  const attachmentId = result.identifiers[0]?.['id'] as string;
  for (let from = 0, ordinal = 0; from < bytes.length; from += CHUNK_BYTES, ordinal++) {
    await manager.insert(AttachmentChunk, {
      attachmentId,
      ordinal,
      orgId: values.orgId,
      bytes: bytes.subarray(from, from + CHUNK_BYTES),
    });
  }
  return attachmentId;
}

export async function insertLink(
  manager: EntityManager,
  values: QueryDeepPartialEntity<AttachmentLink>,
): Promise<void> {
  await manager.insert(AttachmentLink, values);
}

export async function attachmentBytes(manager: EntityManager, attachmentId: string): Promise<Buffer> {
  const chunks = await manager.find(AttachmentChunk, {
    where: { attachmentId },
    order: { ordinal: 'ASC' },
  });
  return Buffer.concat(chunks.map((chunk) => chunk.bytes));
}
