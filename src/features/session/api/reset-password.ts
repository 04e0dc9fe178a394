import { useMutation } from '@tanstack/react-query';
import { call } from '../../../lib/api/call';

/** Asks for a mail with a link; the answer is the same whether the address is known or not. */
export const useAskForReset = () =>
  useMutation({ mutationFn: (email: string) => call('askForReset', { body: { email } }) });

/** Sets a new password by the token of that mail. */
export const useResetPassword = () =>
  useMutation({
    mutationFn: (body: { token: string; password: string }) => call('resetPassword', { body }),
  });
