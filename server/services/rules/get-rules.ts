import { libraryVersion, listConductors as findConductors } from '../../repositories/conductor.repository';
import { currentRuleSet } from '../../repositories/rule-set.repository';
import type * as Api from '../../../shared/contracts/api.generated';
import { isChoosable } from '../../../shared/library/handbook-data';
import type { Caller } from '../cases/caller';

/** The rules in force, which the live check needs. */
export async function getRules({ tx }: Caller): Promise<Api.Rules> {
  const { rules } = await currentRuleSet(tx.manager);
  return {
    bandsVersion: rules.bandsVersion,
    tolerancesVersion: rules.tolerancesVersion,
    bands: rules.bands.map(({ classKv, frequencyHz, parameter, typical, outer, source }) => ({
      classKv,
      frequencyHz,
      parameter,
      typical: [typical[0], typical[1]],
      outer: [outer[0], outer[1]],
      source: source.slice(0, 600),
    })),
    tolerances: { ...rules.tolerances },
    uncertainties: { ...rules.uncertainties },
    owner: { baseMva: rules.owner.baseMva, earthResistivityOhmM: rules.owner.earthResistivityOhmM },
  };
}

/** The conductor library, retired rows marked. */
export async function listConductors({ tx }: Caller): Promise<Api.ConductorList> {
  const rows = await findConductors(tx.manager);
  return {
    version: libraryVersion(rows.filter((row) => !row.retired)),
    items: rows.map(({ data, retired }) => ({
      name: data.name,
      row: { ...data },
      choosable: !retired && isChoosable(data),
      retired,
    })),
  };
}
