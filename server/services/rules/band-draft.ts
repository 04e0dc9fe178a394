import type { BandDraft, SaveBandDraftRequest } from '../../../shared/contracts/api.generated';
import type { Band, Tolerances, Uncertainties } from '../../../shared/checks/rule-set';
import type { UserActor } from '../../database/actor';
import { recordEvent } from '../../database/audit/record-event';
import type { Transaction } from '../../database/transaction';
import { RuleSet } from '../../entities/rules.entities';
import { conflict, invalidContent, stale } from '../../errors/problem';
import type { ProblemFault } from '../../errors/problem';
import { deleteDraft, findDraft, readParts, writeParts } from '../../repositories/rule-parts.repository';
import type { RuleParts } from '../../repositories/rule-parts.repository';
import { currentRuleSet } from '../../repositories/rule-set.repository';

export interface DraftReading {
  /** 0 while nothing was saved: then these are the rules in force. */
  version: number;
  ruleSetVersion: number;
  parts: RuleParts;
}

export async function readBandDraft({ manager }: Transaction): Promise<DraftReading> {
  const draft = await findDraft(manager);
  if (draft) {
    return {
      version: draft.lockVersion,
      ruleSetVersion: draft.version,
      parts: await readParts(manager, draft.id),
    };
  }
  const current = await currentRuleSet(manager);
  return { version: 0, ruleSetVersion: current.version + 1, parts: await readParts(manager, current.id) };
}

function bandFault({ typical: [low, high], outer: [outerLow, outerHigh] }: Band): string | undefined {
  if (low >= high) return 'The lower typical bound must lie below the upper one.';
  if (outerLow > low || outerHigh < high) return 'The outer range must hold the typical range.';
  return undefined;
}

function bandFaults(bands: readonly Band[]): ProblemFault[] {
  const seen = new Set<string>();
  return bands.flatMap((band, index) => {
    const key = `${band.classKv} kV, ${band.frequencyHz} Hz, ${band.parameter}`;
    const twice = seen.has(key) ? `There are two bands for ${key}.` : undefined;
    seen.add(key);
    const message = twice ?? bandFault(band);
    const value = { typical: band.typical, outer: band.outer };
    return message
      ? [{ pointer: `/bands/${index}`, value, expected: 'outer ≤ typical < typical ≤ outer', message }]
      : [];
  });
}

/** The names of tolerances and uncertainties are the checker's; an unknown one would have no effect and is refused. */
function nameFaults(place: string, given: object | undefined, known: object): ProblemFault[] {
  return Object.keys(given ?? {})
    .filter((name) => !Object.hasOwn(known, name))
    .map((name) => ({
      pointer: `/${place}/${name}`,
      value: null,
      expected: Object.keys(known).join(', '),
      message: `The checker knows no "${name}".`,
    }));
}

function changed(parts: RuleParts, request: SaveBandDraftRequest): RuleParts {
  const bands = (request.bands ?? parts.bands) as readonly Band[];
  const faults = [
    ...bandFaults(bands),
    ...nameFaults('tolerances', request.tolerances, parts.tolerances),
    ...nameFaults('uncertainties', request.uncertainties, parts.uncertainties),
  ];
  if (faults.length > 0) throw invalidContent(faults);
  return {
    bands,
    tolerances: { ...parts.tolerances, ...request.tolerances } as Tolerances,
    uncertainties: { ...parts.uncertainties, ...request.uncertainties } as Uncertainties,
    settings: {
      ...parts.settings,
      ...request.owner,
      windowDays: request.windows ?? parts.settings.windowDays,
    },
  };
}

/** The draft's row: made for version 0, else the one of that very version and counted up. */
async function claimDraft(
  { manager }: Transaction,
  actor: UserActor,
  version: number,
  ruleSetVersion: number,
) {
  if (version === 0) {
    if (await findDraft(manager)) throw stale('Somebody has begun a draft in the meantime.');
    const draft = { version: ruleSetVersion, status: 'draft' as const, createdBy: actor.userId };
    const made = await manager.insert(RuleSet, draft);
    return String(made.identifiers[0]?.id);
  }
  const draft = await findDraft(manager);
  if (!draft) throw conflict('There is no draft to change: begin one with version 0.');
  const where = { id: draft.id, status: 'draft' as const, lockVersion: version };
  const counted = await manager.update(RuleSet, where, { lockVersion: version + 1 });
  if (counted.affected !== 1)
    throw stale('Somebody has changed the draft in the meantime.', { currentVersion: draft.lockVersion });
  return draft.id;
}

/** Saves the next rule set as a draft: what is named is replaced, the rest stays. Nothing is in force by it. */
export async function saveBandDraft(
  tx: Transaction,
  actor: UserActor,
  request: SaveBandDraftRequest,
): Promise<DraftReading> {
  const { ruleSetVersion, parts } = await readBandDraft(tx);
  const next = changed(parts, request);
  const id = await claimDraft(tx, actor, request.version, ruleSetVersion);
  await writeParts(tx.manager, id, next);
  recordEvent(tx, { act: 'bands.draft-saved', after: { ruleSetVersion, changed: Object.keys(request) } });
  return readBandDraft(tx);
}

/** Throws the draft away; the rules in force stay as they are. */
export async function discardBandDraft(tx: Transaction, version: number): Promise<DraftReading> {
  const draft = await findDraft(tx.manager);
  if (!draft) throw conflict('There is no draft to throw away.');
  if (!(await deleteDraft(tx.manager, draft.id, version))) {
    throw stale('Somebody has changed the draft in the meantime.', { currentVersion: draft.lockVersion });
  }
  recordEvent(tx, { act: 'bands.draft-discarded', before: { ruleSetVersion: draft.version } });
  return readBandDraft(tx);
}

export function presentDraft({ version, ruleSetVersion, parts }: DraftReading): BandDraft {
  const { bands, tolerances, uncertainties, settings } = parts;
  const { baseMva, earthResistivityOhmM, windowDays } = settings;
  return {
    version,
    ruleSetVersion,
    bands: bands as unknown as BandDraft['bands'],
    tolerances,
    uncertainties: { ...uncertainties },
    owner: { baseMva, earthResistivityOhmM },
    windows: windowDays,
  };
}
