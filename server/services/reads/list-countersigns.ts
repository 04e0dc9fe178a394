import { notFound } from '../../errors/problem';
import { findCountersign, listCountersigns as findAll } from '../../repositories/disposition.repository';
import { namesOf } from '../../repositories/people-names.repository';
import { presentCountersign } from '../../presenters/countersign.presenter';
import type * as Api from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { placeOf } from './get-application';

/** Proposals that reviewers have among themselves, newest first. */
export async function listCountersigns(
  caller: Caller,
  query: Api.ListCountersignsRequest,
): Promise<Api.CountersignList> {
  const { tx, ability } = caller;
  const all = await findAll(tx.manager, ability);
  const people = await namesOf(
    tx.manager,
    all.flatMap((c) => [c.proposedBy, c.decidedBy]),
  );
  const items: Api.Countersign[] = [];
  for (const countersign of all) {
    items.push(presentCountersign(countersign, await placeOf(caller, countersign), people));
  }
  return { items: items.filter(({ outcome }) => query.outcome === undefined || outcome === query.outcome) };
}

export async function getCountersign(caller: Caller, id: string): Promise<Api.Countersign> {
  const { tx, ability } = caller;
  const countersign = await findCountersign(tx.manager, ability, id);
  if (countersign === null) throw notFound();
  const people = await namesOf(tx.manager, [countersign.proposedBy, countersign.decidedBy]);
  return presentCountersign(countersign, await placeOf(caller, countersign), people);
}
