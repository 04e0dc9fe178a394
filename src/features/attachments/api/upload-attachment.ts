import { useMutation } from '@tanstack/react-query';
import type { Attachment } from '#shared/contracts/api.generated';
import { addressOf, fileForm } from '../../../lib/api/call';
import { upload } from '../../../lib/api/upload';
import type { OnProgress } from '../../../lib/api/upload';
import { useInvalidateCase } from '../../../lib/queries/case-key';

/** What a file belongs to: a discrepancy, a line, or the application when neither is named. */
export interface AttachmentSubject {
  discrepancy?: number;
  lineKey?: string;
}

/** The fields that tell the server what the file belongs to. */
export function fieldsOf({ discrepancy, lineKey }: AttachmentSubject): Record<string, string> {
  if (discrepancy !== undefined) return { subject: 'discrepancy', ref: String(discrepancy) };
  return lineKey === undefined ? {} : { subject: 'line', ref: lineKey };
}

/** Sends a file to be kept with the case. */
export function useUploadAttachment(number: string, subject: AttachmentSubject, onProgress: OnProgress) {
  const invalidate = useInvalidateCase();
  return useMutation({
    mutationFn: (file: File) =>
      upload<Attachment>({
        url: addressOf('uploadAttachment', { params: { applicationId: number } }),
        form: fileForm(file, fieldsOf(subject)),
        onProgress,
      }),
    onSuccess: () => invalidate(number),
  });
}
