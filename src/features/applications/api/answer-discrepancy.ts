import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { AnswerDiscrepancyRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { caseChanged } from '../../../lib/queries/case-key';

/** Answers a discrepancy, or keeps the words of an answer that is not sent yet. */
export function useAnswerDiscrepancy(number: string, discrepancy: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: AnswerDiscrepancyRequest) =>
      call('answerDiscrepancy', { params: { applicationId: number, number: discrepancy }, body }),
    onSettled: () => caseChanged(client, number),
  });
}
