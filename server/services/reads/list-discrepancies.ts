import type { Discrepancy, DiscrepancyEntry } from '../../entities/review.entities';
import { asSystem } from '../../database/transaction';
import { notFound } from '../../errors/problem';
import { entriesOf, raisedFrom, type RaisedFrom } from '../../repositories/discrepancy.repository';
import { listAttachments, type LinkedAttachment } from '../../repositories/attachment.repository';
import {
  gridOwner,
  membersAmong,
  namesOf,
  organisationNames,
} from '../../repositories/people-names.repository';
import { revisionLetters } from '../../repositories/revision.repository';
import { presentAttachment } from '../../presenters/attachment.presenter';
import { presentDiscrepancy, type DiscrepancyNames } from '../../presenters/discrepancy.presenter';
import { peopleInViews, presentFinding, type FindingView } from '../../presenters/finding.presenter';
import type * as Api from '../../../shared/contracts/api.generated';
import type { Caller } from '../cases/caller';
import { readCase, type CaseFile } from '../cases/case-file';
import { shownState, visibleDiscrepancies, visibleEntries } from '../discrepancies/visible-discrepancies';
import { findingViews, matterKey } from '../findings/finding-views';

interface Loaded {
  file: CaseFile;
  entries: DiscrepancyEntry[];
  /** Those of them that the caller may read. */
  shown: DiscrepancyEntry[];
  links: RaisedFrom[];
  views: FindingView[];
  attachments: LinkedAttachment[];
  names: DiscrepancyNames;
}

/** Discrepancies of an application with their threads, by number. */
export async function listDiscrepancies(caller: Caller, reference: string): Promise<Api.DiscrepancyList> {
  const file = await readCase(caller, reference);
  const discrepancies = await visibleDiscrepancies(caller, file.application.id);
  const loaded = await load(caller, file, discrepancies);
  return { items: discrepancies.map((discrepancy) => present(caller, discrepancy, loaded)) };
}

export async function getDiscrepancy(
  caller: Caller,
  reference: string,
  number: number,
): Promise<Api.Discrepancy> {
  const file = await readCase(caller, reference);
  const all = await visibleDiscrepancies(caller, file.application.id);
  const discrepancy = all.find((d) => d.number === number);
  if (discrepancy === undefined) throw notFound();
  return present(caller, discrepancy, await load(caller, file, [discrepancy]));
}

async function load(caller: Caller, file: CaseFile, discrepancies: readonly Discrepancy[]): Promise<Loaded> {
  const { tx, ability } = caller;
  const ids = discrepancies.map((d) => d.id);
  const entries = await entriesOf(tx.manager, ids);
  const { run, revision, application } = file;
  const views =
    run?.status === 'done' && revision !== null ? await findingViews(caller, revision, run.id) : [];
  const attachments = await listAttachments(tx.manager, ability, application.id);
  const people = await namesOf(tx.manager, [
    ...discrepancies.map((d) => d.raisedBy),
    ...entries.map((e) => e.writtenBy),
    ...attachments.map((a) => a.attachment.uploadedBy),
    ...peopleInViews(views),
  ]);
  const applicant = (await organisationNames(tx.manager, [application.orgId])).get(application.orgId);
  const owner = await gridOwner(tx.manager);
  const letters = await revisionLetters(tx.manager, application.id);
  const numbers = new Map(discrepancies.map((d) => [d.id, d.number]));
  const writers = entries.map((e) => e.writtenBy);
  const ownersPeople = await asSystem(tx, (manager) => membersAmong(manager, owner.id, writers));
  const names = { people, letters, owner, applicant: applicant ?? owner, ownersPeople, numbers };
  const shown = await visibleEntries(caller, file, entries);
  return { file, entries, shown, links: await raisedFrom(tx.manager, ids), views, attachments, names };
}

function present(caller: Caller, discrepancy: Discrepancy, loaded: Loaded): Api.Discrepancy {
  const { names, file } = loaded;
  const links = loaded.links.filter((link) => link.discrepancyId === discrepancy.id);
  const matters = new Set(links.map(matterKey));
  const findings = loaded.views.filter((view) => matters.has(matterKey(view.finding)));
  const attachments = loaded.attachments.filter(({ link }) => link.discrepancyId === discrepancy.id);
  const own = (entry: DiscrepancyEntry) => entry.discrepancyId === discrepancy.id;
  const shown = loaded.shown.filter(own);
  return presentDiscrepancy(
    { ...discrepancy, state: shownState(discrepancy, loaded.entries.filter(own), shown) },
    {
      links,
      findings: findings.map((view) => presentFinding(view, names)),
      entries: shown,
      attachments: attachments.map((a) => presentAttachment(a, file.application, names)),
      // words that are not sent yet are the applicant's own
      showsDraft: caller.actor.role === 'applicant',
    },
    names,
  );
}
