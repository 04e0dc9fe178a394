import { recordEvent } from '../../database/audit/record-event';
import { asSystem } from '../../database/transaction';
import { forbidden } from '../../errors/problem';
import { drawFreeNumber, insertApplication, insertRound } from '../../repositories/application.repository';
import { currentCalendar } from '../../repositories/calendar.repository';
import type { CreateApplicationRequest } from '../../../shared/contracts/api.generated';
import { localDay } from '../../../shared/workflow/calendar';
import type { Caller } from '../cases/caller';

/** Opens an application with its first round, in Draft. Answers its id. */
export async function createApplication(caller: Caller, request: CreateApplicationRequest): Promise<string> {
  const { tx, actor, ability } = caller;
  const { orgId } = actor;
  if (!ability.can('create', { kind: 'Application', orgId })) throw forbidden();
  const { calendar } = await currentCalendar(tx.manager);
  const year = Number(localDay(tx.now, calendar.timeZone).slice(0, 4));
  const number = await asSystem(tx, (manager) => drawFreeNumber(manager, year));
  const id = await insertApplication(tx.manager, {
    orgId,
    number,
    ...particulars(request),
    createdBy: actor.userId,
    createdAt: tx.now,
    updatedAt: tx.now,
  });
  await insertRound(tx.manager, {
    orgId,
    applicationId: id,
    ordinal: 1,
    kind: 'first',
    state: 'draft',
    openedAt: tx.now,
  });
  recordEvent(tx, {
    act: 'application.created',
    orgId,
    applicationId: id,
    after: { number, title: request.title },
  });
  return id;
}

/** The head of an application as its table has it. */
function particulars(request: CreateApplicationRequest) {
  const { title, connectionKind, capacityMw = null, pointOfConnection, contact } = request;
  return {
    title: title.trim(),
    connectionKind,
    capacityMw,
    pointOfConnection: pointOfConnection.trim(),
    contactName: contact.name.trim(),
    contactEmail: contact.email,
    contactPhone: contact.phone ?? '',
  };
}
