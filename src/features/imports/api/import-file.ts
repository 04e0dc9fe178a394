import { useMutation } from '@tanstack/react-query';
import { call, fileForm } from '../../../lib/api/call';

/** Sends a file to be read; nothing of it is in the draft until the applicant has taken it. */
export function useImportFile(number: string) {
  return useMutation({
    mutationFn: (file: File) =>
      call('importFile', { params: { applicationId: number }, body: fileForm(file) }),
  });
}
