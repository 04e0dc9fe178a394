import { b0AboveB1 } from './physics/b0-above-b1';
import { mutualExceedsSelves } from './physics/mutual-exceeds-selves';
import { notPositive } from './physics/not-positive';
import { r0BelowR1 } from './physics/r0-below-r1';
import { r1BelowDc } from './physics/r1-below-dc';
import { waveSpeedRule } from './physics/wave-speed';
import { x0BelowX1 } from './physics/x0-below-x1';
import { geometryB0 } from './geometry/b0';
import { geometryB0m } from './geometry/b0m';
import { geometryB1 } from './geometry/b1';
import { geometryR0 } from './geometry/r0';
import { geometryR0m } from './geometry/r0m';
import { geometryR1 } from './geometry/r1';
import { rating } from './geometry/rating';
import { wholeLineForm } from './geometry/whole-line-form';
import { geometryX0 } from './geometry/x0';
import { geometryX0m } from './geometry/x0m';
import { geometryX1 } from './geometry/x1';
import { typicalB0 } from './typical/b0';
import { typicalB0OverB1 } from './typical/b0-over-b1';
import { typicalB1 } from './typical/b1';
import { betweenClasses } from './typical/between-classes';
import { noClass } from './typical/no-class';
import { typicalR0MinusR1 } from './typical/r0-minus-r1';
import { typicalR0OverR1 } from './typical/r0-over-r1';
import { typicalR1 } from './typical/r1';
import { typicalSurgeImpedance } from './typical/surge-impedance';
import { typicalWaveSpeed } from './typical/wave-speed';
import { typicalX0 } from './typical/x0';
import { typicalX0OverX1 } from './typical/x0-over-x1';
import { typicalX1 } from './typical/x1';
import { typicalX1OverR1 } from './typical/x1-over-r1';
import { acAgainstDc } from './drawing/ac-against-dc';
import { bundleSpacing } from './drawing/bundle-spacing';
import { cableAsDeclared } from './drawing/cable-as-declared';
import { coincidentWires } from './drawing/coincident-wires';
import { conductorDiameter } from './drawing/conductor-diameter';
import { coreAgainstDiameter } from './drawing/core-against-diameter';
import { couplingNotGiven } from './drawing/coupling-not-given';
import { geometryMissing } from './drawing/geometry-missing';
import { gmrAgainstDiameter } from './drawing/gmr-against-diameter';
import { groundWireBelowPhases } from './drawing/ground-wire-below-phases';
import { heightInFeet } from './drawing/height-in-feet';
import { notComputable } from './drawing/not-computable';
import { overlappingWires } from './drawing/overlapping-wires';
import { phaseHeight } from './drawing/phase-height';
import { phaseSpacing } from './drawing/phase-spacing';
import { resistanceAgainstDiameter } from './drawing/resistance-against-diameter';
import { resistivityNotGiven } from './drawing/resistivity-not-given';
import { sagNotGiven } from './drawing/sag-not-given';
import { wireInGround } from './drawing/wire-in-ground';
import { zeroSequenceNotGiven } from './drawing/zero-sequence-not-given';
import type { Rule, RuleFacts } from './rule';

/**
 * Every rule of the check, in the order in which findings are listed. A finding's code is its rule's code; the
 * product prints this table with each rule's needs and source.
 */
export const RULES: readonly Rule[] = [
  notPositive,
  waveSpeedRule,
  r1BelowDc,
  r0BelowR1,
  x0BelowX1,
  b0AboveB1,
  mutualExceedsSelves,
  geometryR1,
  geometryX1,
  geometryB1,
  geometryR0,
  geometryX0,
  geometryB0,
  geometryR0m,
  geometryX0m,
  geometryB0m,
  wholeLineForm,
  rating,
  typicalR1,
  typicalX1,
  typicalB1,
  typicalR0MinusR1,
  typicalX0,
  typicalB0,
  typicalX1OverR1,
  typicalX0OverX1,
  typicalR0OverR1,
  typicalB0OverB1,
  typicalSurgeImpedance,
  typicalWaveSpeed,
  betweenClasses,
  noClass,
  geometryMissing,
  coincidentWires,
  overlappingWires,
  wireInGround,
  notComputable,
  phaseSpacing,
  phaseHeight,
  heightInFeet,
  groundWireBelowPhases,
  bundleSpacing,
  gmrAgainstDiameter,
  acAgainstDc,
  coreAgainstDiameter,
  conductorDiameter,
  resistanceAgainstDiameter,
  sagNotGiven,
  resistivityNotGiven,
  zeroSequenceNotGiven,
  couplingNotGiven,
  cableAsDeclared,
];

/**
 * The facts of the rule with the given code.
 *
 * @param code a finding's code
 * @returns undefined for a code that no rule has
 */
export function ruleOf(code: string): RuleFacts | undefined {
  return RULES.find((rule) => rule.code === code);
}
