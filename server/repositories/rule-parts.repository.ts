import type { EntityManager } from 'typeorm';
import { Band, RuleSet, Setting, Tolerance, Uncertainty, VoltageClass } from '../entities/rules.entities';
import type { Band as CheckBand, Tolerances, Uncertainties } from '../../shared/checks/rule-set';
import { loadBands, loadSettings, loadTolerances, loadUncertainties } from './rule-set.repository';
import type { OwnerSettings } from './rule-set.repository';

/** Everything that a rule set consists of, whatever its status. */
export interface RuleParts {
  bands: readonly CheckBand[];
  tolerances: Tolerances;
  uncertainties: Uncertainties;
  settings: OwnerSettings;
}

export async function readParts(manager: EntityManager, ruleSetId: string): Promise<RuleParts> {
  return {
    bands: await loadBands(manager, ruleSetId),
    tolerances: await loadTolerances(manager, ruleSetId),
    uncertainties: await loadUncertainties(manager, ruleSetId),
    settings: await loadSettings(manager, ruleSetId),
  };
}

async function writeBands(
  manager: EntityManager,
  ruleSetId: string,
  bands: readonly CheckBand[],
): Promise<void> {
  const keyOf = ({ classKv, frequencyHz }: { classKv: number; frequencyHz: number }) =>
    `${classKv} ${frequencyHz}`;
  await manager.delete(Band, { ruleSetId });
  await manager.delete(VoltageClass, { ruleSetId });
  const classes = [...new Map(bands.map((band) => [keyOf(band), band])).values()];
  if (classes.length === 0) return;
  await manager.insert(
    VoltageClass,
    classes.map(({ classKv, frequencyHz }) => ({ ruleSetId, classKv, frequencyHz })),
  );
  const ids = new Map((await manager.findBy(VoltageClass, { ruleSetId })).map((row) => [keyOf(row), row.id]));
  await manager.insert(
    Band,
    bands.map((band) => ({
      ruleSetId,
      voltageClassId: ids.get(keyOf(band)) ?? '',
      parameter: band.parameter,
      typicalLow: band.typical[0],
      typicalHigh: band.typical[1],
      outerLow: band.outer[0],
      outerHigh: band.outer[1],
      source: band.source,
    })),
  );
}

/** Replaces the parts of a draft; a published set refuses in the database itself. */
export async function writeParts(manager: EntityManager, ruleSetId: string, parts: RuleParts): Promise<void> {
  const { bands, tolerances, uncertainties, settings } = parts;
  await writeBands(manager, ruleSetId, bands);
  await manager.delete(Tolerance, { ruleSetId });
  await manager.insert(
    Tolerance,
    Object.entries(tolerances).map(([parameter, { relative, cap }]) => ({
      ruleSetId,
      parameter,
      relative,
      cap,
    })),
  );
  await manager.delete(Uncertainty, { ruleSetId });
  await manager.insert(
    Uncertainty,
    Object.entries(uncertainties).map(([input, value]) => ({ ruleSetId, input, value: value as never })),
  );
  await manager.delete(Setting, { ruleSetId });
  await manager.insert(
    Setting,
    Object.entries(settings).map(([key, value]) => ({ ruleSetId, key, value: value as never })),
  );
}

/** Deletes a draft of that very version; false when it is not that one any more. */
export async function deleteDraft(manager: EntityManager, id: string, lockVersion: number): Promise<boolean> {
  const where = { id, status: 'draft' as const, lockVersion };
  if (!(await manager.existsBy(RuleSet, where))) return false;
  for (const part of [Band, VoltageClass, Tolerance, Uncertainty, Setting]) {
    await manager.delete(part, { ruleSetId: id });
  }
  return (await manager.delete(RuleSet, where)).affected === 1;
}

export const findDraft = (manager: EntityManager) => manager.findOneBy(RuleSet, { status: 'draft' });

export const listRuleSets = (manager: EntityManager) =>
  manager.find(RuleSet, { order: { version: 'DESC' }, take: 1000 });
