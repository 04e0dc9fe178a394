import { conditionalUpdate } from '../../database/conditional-update';
import { recordEvent } from '../../database/audit/record-event';
import { Round, type Application } from '../../entities/case.entities';
import { conflict } from '../../errors/problem';
import { touchApplication } from '../../repositories/application.repository';
import type { UpdateApplicationRequest } from '../../../shared/contracts/api.generated';
import { isDraftEditable, STATE_WORDS } from '../../../shared/workflow/states';
import type { Caller } from '../cases/caller';
import { holdCase, type CaseFile } from '../cases/case-file';
import { requireVersion } from '../cases/take-step';

/** Refuses changes of a draft that is not the applicant's turn. */
export function requireEditable({ round }: CaseFile): void {
  if (isDraftEditable(round.state)) return;
  throw conflict(`The draft is closed while the application is ${STATE_WORDS[round.state]}.`, {
    state: round.state,
  });
}

/** Changes the head of an application while it is the applicant's turn. */
export async function updateApplication(
  caller: Caller,
  reference: string,
  request: UpdateApplicationRequest,
): Promise<void> {
  const { tx } = caller;
  const file = await holdCase(caller, reference, 'update');
  requireVersion(file, request.version);
  requireEditable(file);
  const { application, round } = file;
  const changes = changedColumns(request);
  await conditionalUpdate(tx.manager, Round, { id: round.id, version: round.version }, {});
  await touchApplication(tx.manager, application.id, tx.now, changes);
  const before = Object.fromEntries(
    Object.keys(changes).map((key) => [key, application[key as keyof Application]]),
  );
  recordEvent(tx, {
    act: 'application.updated',
    orgId: application.orgId,
    applicationId: application.id,
    before,
    after: changes,
  });
}

function changedColumns(request: UpdateApplicationRequest): Partial<Application> {
  const { title, connectionKind, capacityMw, pointOfConnection, contact } = request;
  return {
    ...(title === undefined ? {} : { title: title.trim() }),
    ...(connectionKind === undefined ? {} : { connectionKind }),
    ...(capacityMw === undefined ? {} : { capacityMw }),
    ...(pointOfConnection === undefined ? {} : { pointOfConnection: pointOfConnection.trim() }),
    ...(contact === undefined
      ? {}
      : { contactName: contact.name.trim(), contactEmail: contact.email, contactPhone: contact.phone ?? '' }),
  };
}
