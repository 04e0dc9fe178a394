import type { Grade } from '../../types';
import type { FindingDraft, LineRule } from '../rule';
import { conductorsOf, drawnSections, positionPointer } from './places';
import type { UsedConductor } from './places';

/** What a rule about a conductor's own data says of one. */
export interface ConductorVerdict {
  grade: Grade;
  message: string;
}

/** A rule that holds the data of each conductor against each other. */
export function conductorRule(
  name: string,
  grades: readonly Grade[],
  needs: string,
  sentence: string,
  source: string,
  judge: (used: UsedConductor) => ConductorVerdict | null,
): LineRule {
  return {
    code: `drawing.${name}`,
    family: 'drawing',
    grades,
    parameter: null,
    needs,
    sentence,
    source,
    on: 'line',
    apply: ({ line }) =>
      drawnSections(line).flatMap(({ section, index }) =>
        conductorsOf(section).flatMap((used): FindingDraft[] => {
          const verdict = judge(used);
          if (verdict === null) return [];
          const where = `${positionPointer(section, used.index)}/conductor`;
          return [{ ...verdict, section: index, position: used.index, where }];
        }),
      ),
  };
}

/** D.c. resistance at the conductor's own temperature, Ω/km; undefined where it is not filed. */
export function dcAtTemperature(used: UsedConductor): number | undefined {
  const { dcResistance20OhmPerKm, temperatureC, temperatureCoefficientPerK } = used.conductor;
  if (dcResistance20OhmPerKm === undefined) return undefined;
  const coefficient = temperatureCoefficientPerK ?? 0.00403;
  return dcResistance20OhmPerKm * (1 + coefficient * ((temperatureC ?? 20) - 20));
}
