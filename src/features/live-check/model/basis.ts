import type { Conductor, ConductorList, Rules } from '#shared/contracts/api.generated';
import type { RuleSet } from '#shared/checks/rule-set';
import type { LibraryConductor } from '#shared/library/types';
import type { CheckBasis } from '../worker/messages';

function rowOf({ name, family, source, data }: Conductor): LibraryConductor[] {
  const number = (key: string): number | undefined => {
    const value = data?.[key];
    return typeof value === 'number' ? value : undefined;
  };
  const diameterMm = number('diameterMm');
  const ohmPerKm = number('acResistanceOhmPerKm');
  const temperatureC = number('temperatureC');
  if (diameterMm === undefined) return [];
  return [
    {
      name,
      family,
      source,
      tag: 'T',
      diameterMm,
      coreDiameterMm: number('coreDiameterMm'),
      gmrMm: number('gmrMm'),
      dcResistance20OhmPerKm: number('dcResistance20OhmPerKm'),
      acResistances: ohmPerKm === undefined || temperatureC === undefined ? [] : [{ temperatureC, ohmPerKm }],
      temperatureCoefficientPerK: number('temperatureCoefficientPerK'),
    },
  ];
}

/** What the API says of rules and conductors, as the check takes it. */
export function checkBasis(rules: Rules, conductors: ConductorList['items']): CheckBasis {
  return {
    rules: rules as unknown as RuleSet,
    library: { version: 'current', conductors: conductors.flatMap(rowOf) },
  };
}
