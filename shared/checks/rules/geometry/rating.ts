import { circuitAmpacity } from '../../../engine/index';
import type { CircuitContext } from '../../context';
import { DEFAULT_WEATHER } from '../../defaults/weather';
import { percent, withUnit } from '../../words';
import type { CircuitRule } from '../rule';

/** Share by which a rating may exceed the ampacity without a question: other weather, other surface. */
const ROOM = 0.1;

/** A rating above what the conductors carry. */
export const rating: CircuitRule = {
  code: 'geometry.rating',
  family: 'geometry',
  grades: ['explain'],
  parameter: 'ratingA',
  needs: 'a rating with its maximum temperature, and positions',
  sentence:
    'A declared rating is at most 10 % above what the conductors carry at the same temperature under the owner’s weather.',
  source: 'steady-state heat balance of IEEE Std 738',
  on: 'circuit',
  apply: (context) => {
    const { ratingA, maxTemperatureC, pointer } = context.circuit;
    if (ratingA === undefined || maxTemperatureC === undefined) return [];
    const ampacityA = leastAmpacityA(context, maxTemperatureC);
    if (ampacityA === null || ratingA <= ampacityA * (1 + ROOM)) return [];
    return [
      {
        grade: 'explain',
        parameter: 'ratingA',
        declared: ratingA,
        recomputed: ampacityA,
        deviation: ratingA / ampacityA - 1,
        tolerance: ROOM,
        where: `${pointer}/ratingA`,
        message: `The rating of ${withUnit(ratingA, 'A', 4)} is ${percent(ratingA / ampacityA - 1)} above what the conductors carry at ${withUnit(maxTemperatureC, '°C')} under the weather assumed (${withUnit(ampacityA, 'A', 4)}).`,
      },
    ];
  },
};

/** The least of the sections' ampacities, A; null where one cannot be computed. */
function leastAmpacityA({ lineContext, circuit }: CircuitContext, maxTemperatureC: number): number | null {
  const { line, rules } = lineContext;
  let least: number | null = null;
  for (const section of line.sections) {
    if (section.kind !== 'overhead') continue;
    const result = circuitAmpacity(
      section.input,
      circuit.circuit,
      maxTemperatureC,
      rules.owner.weather ?? DEFAULT_WEATHER,
      line.frequencyHz,
    );
    if (!result.ok) return null;
    least = Math.min(least ?? Infinity, result.value.currentA);
  }
  return least;
}
