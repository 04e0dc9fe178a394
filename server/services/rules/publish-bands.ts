import type { Band } from '../../../shared/checks/rule-set';
import type { UserActor } from '../../database/actor';
import { recordEvent } from '../../database/audit/record-event';
import type { Transaction } from '../../database/transaction';
import { RuleSet } from '../../entities/rules.entities';
import { conflict, stale } from '../../errors/problem';
import { findDraft, readParts } from '../../repositories/rule-parts.repository';
import type { RuleParts } from '../../repositories/rule-parts.repository';
import { currentRuleSet } from '../../repositories/rule-set.repository';

const nameOf = ({ classKv, frequencyHz, parameter }: Band) => `${classKv} kV ${frequencyHz} Hz ${parameter}`;
const same = (a: unknown, b: unknown) => JSON.stringify(a) === JSON.stringify(b);

/** Entries that differ between two objects, as they were and as they are. */
function differences(before: Record<string, unknown>, after: Record<string, unknown>) {
  const names = [...new Set([...Object.keys(before), ...Object.keys(after)])];
  const changed = names.filter((name) => !same(before[name], after[name]));
  const pick = (from: Record<string, unknown>) =>
    Object.fromEntries(changed.map((name) => [name, from[name] ?? null]));
  return { before: pick(before), after: pick(after) };
}

const byName = ({ bands }: RuleParts) =>
  Object.fromEntries(
    bands.map((band) => [nameOf(band), { typical: band.typical, outer: band.outer, source: band.source }]),
  );

/** What the trail keeps of a publication: every value that changed, before and after. */
function whatChanged(before: RuleParts, after: RuleParts) {
  const parts = {
    bands: differences(byName(before), byName(after)),
    tolerances: differences({ ...before.tolerances }, { ...after.tolerances }),
    uncertainties: differences({ ...before.uncertainties }, { ...after.uncertainties }),
    settings: differences({ ...before.settings }, { ...after.settings }),
  };
  const side = (which: 'before' | 'after') =>
    Object.fromEntries(Object.entries(parts).map(([name, part]) => [name, part[which]]));
  return { before: side('before'), after: side('after') };
}

/** The draft comes into force: every check from now on is made with it, none of those made before changes. */
export async function publishBands(
  tx: Transaction,
  actor: UserActor,
  { version, reason }: { version: number; reason: string },
): Promise<RuleSet> {
  const { manager, now } = tx;
  const draft = await findDraft(manager);
  if (!draft) throw conflict('There is no draft to publish.');
  const current = await currentRuleSet(manager);
  const changes = whatChanged(await readParts(manager, current.id), await readParts(manager, draft.id));
  const published = await manager.update(
    RuleSet,
    { id: draft.id, status: 'draft', lockVersion: version },
    { status: 'published', reason, effectiveFrom: now, publishedAt: now, publishedBy: actor.userId },
  );
  if (published.affected !== 1) {
    throw stale('Somebody has changed the draft in the meantime.', { currentVersion: draft.lockVersion });
  }
  recordEvent(tx, {
    act: 'bands.published',
    before: { ruleSetVersion: current.version, ...changes.before },
    after: { ruleSetVersion: draft.version, reason, ...changes.after },
  });
  return manager.findOneByOrFail(RuleSet, { id: draft.id });
}
