import type { Countersign } from '../../entities/review.entities';
import { notFound } from '../../errors/problem';
import {
  countersignPlaces,
  findCountersign,
  listCountersigns as findAll,
} from '../../repositories/disposition.repository';
import { namesOf } from '../../repositories/people-names.repository';
import { presentCountersign } from '../../presenters/countersign.presenter';
import type * as Api from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';

/** Proposals that reviewers have among themselves, newest first. */
export async function listCountersigns(
  caller: Caller,
  query: Api.ListCountersignsRequest,
): Promise<Api.CountersignList> {
  const items = await present(caller, await findAll(caller.tx.manager, caller.ability));
  return { items: items.filter(({ outcome }) => query.outcome === undefined || outcome === query.outcome) };
}

export async function getCountersign(caller: Caller, id: string): Promise<Api.Countersign> {
  const countersign = await findCountersign(caller.tx.manager, caller.ability, id);
  const [item] = countersign === null ? [] : await present(caller, [countersign]);
  if (item === undefined) throw notFound();
  return item;
}

async function present({ tx }: Caller, countersigns: readonly Countersign[]): Promise<Api.Countersign[]> {
  const places = await countersignPlaces(
    tx.manager,
    countersigns.map((countersign) => countersign.id),
  );
  const people = await namesOf(
    tx.manager,
    countersigns.flatMap((countersign) => [countersign.proposedBy, countersign.decidedBy]),
  );
  return countersigns.flatMap((countersign) => {
    const place = places.get(countersign.id);
    return place === undefined ? [] : [presentCountersign(countersign, place, people)];
  });
}
