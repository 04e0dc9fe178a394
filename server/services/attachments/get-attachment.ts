import { notFound } from '../../errors/problem';
import { attachmentBytes, findAttachment } from '../../repositories/attachment.repository';
import type { Caller } from '../cases/caller';
import { readCase } from '../cases/case-file';
import { attachmentsOf } from './upload-attachment';

/** The bytes of an attachment, for those who may see what it hangs on. */
export async function getAttachment(caller: Caller, reference: string, attachmentId: string) {
  const { tx, ability } = caller;
  const { application } = await readCase(caller, reference);
  const attachment = await findAttachment(tx.manager, ability, application.id, attachmentId);
  const visible = (await attachmentsOf(caller, reference)).items;
  if (attachment === null || !visible.some((item) => item.id === attachmentId)) throw notFound();
  const bytes = await attachmentBytes(tx.manager, attachment.id);
  return { bytes, mediaType: attachment.mediaType, fileName: attachment.name };
}
