import { useMutation } from '@tanstack/react-query';
import type { Import } from '#shared/contracts/api.generated';
import { addressOf, fileForm } from '../../../lib/api/call';
import { upload } from '../../../lib/api/upload';
import type { Correction } from '../model/dialect-words';
import type { OnProgress } from '../../../lib/api/upload';

interface Reading {
  file: File;
  /** How it is written, where the applicant says so. */
  correction?: Partial<Correction>;
}

/** Sends a file to be read; nothing of it is in the draft until the applicant has taken it. */
export function useImportFile(number: string, onProgress: OnProgress) {
  return useMutation({
    mutationFn: ({ file, correction = {} }: Reading) =>
      upload<Import>({
        url: addressOf('importFile', { params: { applicationId: number } }),
        form: fileForm(file, { ...correction }),
        onProgress,
      }),
  });
}
