import { useMutation } from '@tanstack/react-query';
import type { AskForAccountRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';

/** Asks the grid owner for an account. */
export const useAskForAccount = () =>
  useMutation({ mutationFn: (body: AskForAccountRequest) => call('askForAccount', { body }) });
