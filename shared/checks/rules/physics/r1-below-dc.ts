import type { NormalisedOverhead, NormalisedSection } from '../../../filing/types';
import { quantity, percent } from '../../words';
import { pointerOf } from '../rule';
import type { CircuitRule } from '../rule';

/** R1 below what direct current at 20 °C would meet. */
export const r1BelowDc: CircuitRule = {
  code: 'physics.r1-below-dc',
  family: 'physics',
  grades: ['must-answer'],
  parameter: 'r1',
  needs: 'R1, positions, and the d.c. resistance at 20 °C of every phase conductor',
  sentence:
    'R1 is at least the conductor’s d.c. resistance at 20 °C divided by the number of subconductors, less the tolerance.',
  source: 'skin effect and temperature only add resistance',
  on: 'circuit',
  apply: (context) => {
    const declared = context.declared.r1;
    const floor = dcFloorOhmPerKm(context.lineContext.line.sections, context.circuit.circuit);
    if (declared === undefined || declared <= 0 || floor === null) return [];
    const weighing = context.weighings.r1;
    const tolerance = weighing?.tolerance.total ?? context.lineContext.rules.tolerances.r1.relative;
    if (declared >= floor * (1 - tolerance)) return [];
    return [
      {
        grade: 'must-answer',
        parameter: 'r1',
        declared,
        tolerance,
        where: pointerOf(context, 'r1'),
        message: `R1 is ${quantity('r1', declared)}, ${percent(1 - declared / floor)} below the d.c. resistance at 20\u2009°C of the conductors filed (${quantity('r1', floor)}).`,
      },
    ];
  },
};

/** Length-weighted d.c. resistance at 20 °C of a circuit's bundles, Ω/km; null where a section lacks the data. */
export function dcFloorOhmPerKm(sections: readonly NormalisedSection[], circuit: number): number | null {
  let sum = 0;
  let lengthKm = 0;
  for (const section of sections) {
    if (section.kind !== 'overhead') return null;
    const floor = sectionFloor(section, circuit);
    if (floor === null) return null;
    sum += floor * section.lengthKm;
    lengthKm += section.lengthKm;
  }
  return lengthKm > 0 ? sum / lengthKm : null;
}

function sectionFloor(section: NormalisedOverhead, circuit: number): number | null {
  let sum = 0;
  let phases = 0;
  for (const position of section.input.positions) {
    if (position.kind !== 'phase' || position.circuit !== circuit) continue;
    const dc = position.conductor.dcResistance20OhmPerKm;
    if (dc === undefined) return null;
    sum += dc / position.bundleCount;
    phases += 1;
  }
  return phases > 0 ? sum / phases : null;
}
