import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { Application, CreateApplicationRequest } from '#shared/contracts/api.generated';
import { call } from '../../../lib/api/call';
import { caseChanged } from '../../../lib/queries/case-key';

interface Creation {
  body: CreateApplicationRequest;
  /** One key for one press of the button, so that a repeated request makes one application. */
  idempotencyKey: string;
}

/** Opens a new application; it gets its number at once. */
export function useCreateApplication() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (creation: Creation): Promise<Application> => call('createApplication', creation),
    onSuccess: (application) => caseChanged(client, application.number),
  });
}
