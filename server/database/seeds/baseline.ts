import type { EntityManager } from 'typeorm';
import { Calendar } from '../../entities/correspondence.entities';
import {
  Band,
  Conductor,
  ConductorVersion,
  RuleSet,
  Setting,
  Tolerance,
  Uncertainty,
  VoltageClass,
} from '../../entities/rules.entities';
import { DEFAULT_RULE_SET } from '../../../shared/checks/defaults/rule-set';
import { STARTING_LIBRARY } from '../../../shared/library/conductors';
import { DEFAULT_WINDOW_DAYS } from '../../../shared/workflow/windows';

/** What every installation begins with, with or without the demo: rules, the conductor library, a calendar. */
export async function seedBaseline(
  manager: EntityManager,
  { now, timeZone }: { now: Date; timeZone: string },
): Promise<void> {
  if (await manager.existsBy(RuleSet, { status: 'published' })) return;
  await seedRuleSet(manager, now);
  await seedLibrary(manager, now);
  await manager.insert(Calendar, { version: 1, timeZone, weekendDays: [0, 6], createdAt: now });
}

async function seedRuleSet(manager: EntityManager, now: Date): Promise<void> {
  const { bands, tolerances, uncertainties, owner } = DEFAULT_RULE_SET;
  const reason = 'The defaults that the product begins with.';
  const inserted = await manager.insert(RuleSet, { version: 1, status: 'draft', reason });
  const ruleSetId = inserted.identifiers[0]?.['id'] as string;
  await seedBands(manager, ruleSetId, bands);
  await manager.insert(
    Tolerance,
    Object.entries(tolerances).map(([parameter, { relative, cap }]) => ({
      ruleSetId,
      parameter,
      relative,
      cap,
    })),
  );
  await manager.insert(
    Uncertainty,
    Object.entries(uncertainties).map(([input, value]) => ({ ruleSetId, input, value: value as never })),
  );
  const settings = { ...owner, windowDays: DEFAULT_WINDOW_DAYS };
  await manager.insert(
    Setting,
    Object.entries(settings).map(([key, value]) => ({ ruleSetId, key, value: value as never })),
  );
  // parts of a published set are fixed, so it is published once all of them are there
  await manager.update(
    RuleSet,
    { id: ruleSetId },
    { status: 'published', effectiveFrom: now, publishedAt: now },
  );
}

async function seedBands(
  manager: EntityManager,
  ruleSetId: string,
  bands: typeof DEFAULT_RULE_SET.bands,
): Promise<void> {
  const keys = [...new Set(bands.map((band) => `${band.classKv} ${band.frequencyHz}`))];
  const classes = keys.map((key) => {
    const [classKv = 0, frequencyHz = 0] = key.split(' ').map(Number);
    return { ruleSetId, classKv, frequencyHz };
  });
  const inserted = await manager.insert(VoltageClass, classes);
  const ids = new Map(keys.map((key, i) => [key, inserted.identifiers[i]?.['id'] as string]));
  await manager.insert(
    Band,
    bands.map(({ classKv, frequencyHz, parameter, typical, outer, source }) => ({
      ruleSetId,
      voltageClassId: ids.get(`${classKv} ${frequencyHz}`) ?? '',
      parameter,
      typicalLow: typical[0],
      typicalHigh: typical[1],
      outerLow: outer[0],
      outerHigh: outer[1],
      source,
    })),
  );
}

async function seedLibrary(manager: EntityManager, now: Date): Promise<void> {
  const { conductors } = STARTING_LIBRARY;
  const inserted = await manager.insert(
    Conductor,
    conductors.map(({ name }) => ({ name })),
  );
  await manager.insert(
    ConductorVersion,
    conductors.map((data, i) => ({
      conductorId: inserted.identifiers[i]?.['id'] as string,
      ordinal: 1,
      data: data as never,
      source: data.source,
      tag: data.tag,
      createdAt: now,
    })),
  );
}
