import { useMutation } from '@tanstack/react-query';
import type { Import } from '#shared/contracts/api.generated';
import { addressOf, fileForm } from '../../../lib/api/call';
import { upload } from '../../../lib/api/upload';
import type { OnProgress } from '../../../lib/api/upload';

/** Sends a file to be read; nothing of it is in the draft until the applicant has taken it. */
export function useImportFile(number: string, onProgress: OnProgress) {
  return useMutation({
    mutationFn: (file: File) =>
      upload<Import>({
        url: addressOf('importFile', { params: { applicationId: number } }),
        form: fileForm(file),
        onProgress,
      }),
  });
}
