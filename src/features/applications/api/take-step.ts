import { useMutation, useQueryClient } from '@tanstack/react-query';
import type {
  AmendApplicationRequest,
  FileApplicationRequest,
  WithdrawApplicationRequest,
} from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { caseChanged } from '../../../lib/queries/case-key';

/** The three steps that an applicant takes, each with what it says. */
export type ApplicantStep =
  | { step: 'file'; body: FileApplicationRequest; idempotencyKey: string }
  | { step: 'withdraw'; body: WithdrawApplicationRequest; idempotencyKey: string }
  | { step: 'amend'; body: AmendApplicationRequest; idempotencyKey: string };

function send(number: string, taken: ApplicantStep) {
  const params = { applicationId: number };
  const { idempotencyKey } = taken;
  if (taken.step === 'file') return call('fileApplication', { params, body: taken.body, idempotencyKey });
  if (taken.step === 'withdraw')
    return call('withdrawApplication', { params, body: taken.body, idempotencyKey });
  return call('amendApplication', { params, body: taken.body, idempotencyKey });
}

/** Files, withdraws or amends; whatever the answer, the case is read again afterwards. */
export function useTakeStep(number: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (taken: ApplicantStep) => send(number, taken),
    onSettled: () => caseChanged(client, number),
  });
}
