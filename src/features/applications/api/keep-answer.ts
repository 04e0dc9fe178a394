import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { Discrepancy } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { discrepanciesQuery } from '../../../lib/queries/list-discrepancies';

interface Kept {
  by: 'change' | 'explanation';
  text: string;
  version: number;
}

/** Keeps the words of an answer that is not sent yet; the list learns the new version without being read again. */
export function useKeepAnswer(number: string, discrepancy: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (kept: Kept) =>
      call('answerDiscrepancy', {
        params: { applicationId: number, number: discrepancy },
        body: { ...kept, draft: true },
      }),
    onSuccess: (saved: Discrepancy) =>
      client.setQueryData(discrepanciesQuery(number).queryKey, (list) =>
        list ? { ...list, items: list.items.map((d) => (d.number === saved.number ? saved : d)) } : list,
      ),
  });
}
