import type { EntityManager } from 'typeorm';
import {
  Band,
  RuleSet as StoredRuleSet,
  Setting,
  Tolerance,
  Uncertainty,
  VoltageClass,
} from '../entities/rules.entities';
import type { BandParameter } from '../../shared/checks/parameters';
import type { Band as CheckBand, RuleSet, Tolerances, Uncertainties } from '../../shared/checks/rule-set';
import type { WindowDays } from '../../shared/workflow/windows';

/** A published rule set with what a check and the windows need of it. */
export interface LoadedRuleSet {
  id: string;
  version: number;
  rules: RuleSet;
  settings: OwnerSettings;
}

/** Settings of the owner, by key of the table. */
export interface OwnerSettings {
  baseMva: number;
  earthResistivityOhmM: number;
  windowDays: WindowDays;
}

/** Published sets never change, so one that was read once is good for as long as the process runs. */
const loaded = new Map<string, LoadedRuleSet>();
const KEEP = 20;

/** The rule set in force: the newest of the published ones. */
export async function currentRuleSet(manager: EntityManager): Promise<LoadedRuleSet> {
  const current = await manager.findOne(StoredRuleSet, {
    where: { status: 'published' },
    order: { version: 'DESC' },
  });
  if (current === null) throw new Error('no rule set has been published');
  return ruleSetById(manager, current.id);
}

export async function ruleSetById(manager: EntityManager, id: string): Promise<LoadedRuleSet> {
  const known = loaded.get(id);
  if (known !== undefined) return known;
  const set = await load(manager, id);
  if (loaded.size >= KEEP) loaded.clear();
  loaded.set(id, set);
  return set;
}

async function load(manager: EntityManager, id: string): Promise<LoadedRuleSet> {
  const stored = await manager.findOneByOrFail(StoredRuleSet, { id, status: 'published' });
  const settings = await loadSettings(manager, id);
  const version = String(stored.version);
  const { baseMva, earthResistivityOhmM } = settings;
  const rules: RuleSet = {
    bandsVersion: version,
    bands: await loadBands(manager, id),
    tolerancesVersion: version,
    tolerances: await loadTolerances(manager, id),
    uncertainties: await loadUncertainties(manager, id),
    owner: { baseMva, earthResistivityOhmM },
  };
  return { id, version: stored.version, rules, settings };
}

export async function loadBands(manager: EntityManager, ruleSetId: string): Promise<CheckBand[]> {
  const classes = new Map((await manager.findBy(VoltageClass, { ruleSetId })).map((c) => [c.id, c]));
  const bands = await manager.findBy(Band, { ruleSetId });
  return bands.flatMap((band) => {
    const voltage = classes.get(band.voltageClassId);
    if (voltage === undefined) return [];
    return [
      {
        classKv: voltage.classKv,
        frequencyHz: voltage.frequencyHz,
        parameter: band.parameter as BandParameter,
        typical: [band.typicalLow, band.typicalHigh] as const,
        outer: [band.outerLow, band.outerHigh] as const,
        source: band.source,
      },
    ];
  });
}

export async function loadTolerances(manager: EntityManager, ruleSetId: string): Promise<Tolerances> {
  const rows = await manager.findBy(Tolerance, { ruleSetId });
  const entries = rows.map(({ parameter, relative, cap }) => [parameter, { relative, cap: cap ?? relative }]);
  return Object.fromEntries(entries) as Tolerances;
}

export async function loadUncertainties(manager: EntityManager, ruleSetId: string): Promise<Uncertainties> {
  const rows = await manager.findBy(Uncertainty, { ruleSetId });
  return Object.fromEntries(rows.map(({ input, value }) => [input, value])) as unknown as Uncertainties;
}

export async function loadSettings(manager: EntityManager, ruleSetId: string): Promise<OwnerSettings> {
  const rows = await manager.findBy(Setting, { ruleSetId });
  return Object.fromEntries(rows.map(({ key, value }) => [key, value])) as unknown as OwnerSettings;
}
