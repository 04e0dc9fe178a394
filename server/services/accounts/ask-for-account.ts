import type { AskForAccountRequest } from '../../../shared/contracts/api.generated';
import { recordEvent } from '../../database/audit/record-event';
import type { Transaction } from '../../database/transaction';
import { Invitation } from '../../entities/people.entities';
import type { Context } from '../../integrations/context';
import { emailKey } from '../../repositories/people.repository';
import { signInLimits } from '../session/sign-in-limits';

/** Notes the wish for an account; the answer is the same whether there is one already or not. */
export async function askForAccount(
  tx: Transaction,
  { pool, config }: Context,
  { email, name, organisation, message }: AskForAccountRequest,
  address: string,
): Promise<void> {
  const limits = signInLimits(pool, config.sessionSecret);
  await limits.require(`account ${emailKey(email)}`, address);
  await limits.failed(`account ${emailKey(email)}`, address);
  await tx.manager.insert(Invitation, {
    email,
    displayName: name,
    askedOrganisation: organisation,
    message: message ?? null,
    role: 'applicant',
    status: 'asked',
    createdAt: tx.now,
  });
  recordEvent(tx, { act: 'account.asked-for', after: { email, organisation } });
}
