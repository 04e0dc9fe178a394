import { roundingShare } from '../../context';
import { waveSpeed } from '../../derive';
import { figure } from '../../words';
import { pointerOf } from '../rule';
import type { CircuitRule } from '../rule';

/** Fastest wave that the rule lets pass, as a fraction of light's. */
export const FASTEST_WAVE = 1.02;

/** A wave faster than light, by more than rounding explains. */
export const waveSpeedRule: CircuitRule = {
  code: 'physics.wave-speed',
  family: 'physics',
  grades: ['must-answer'],
  parameter: 'waveSpeed',
  needs: 'X1 and B1; a line that is overhead by nine tenths of its length',
  sentence:
    'ω/√(X1·B1) is at most 1.02 of the speed of light, or what rounding of the declared digits explains, where that is more.',
  source: 'Maxwell’s equations for wires in air; 714 published circuits of Great Britain lie at 0.97 to 0.99',
  on: 'circuit',
  apply: (context) => {
    const { x1, b1 } = context.declared;
    if (!context.lineContext.isOverhead || x1 === undefined || b1 === undefined) return [];
    if (!(x1 > 0 && b1 > 0)) return [];
    const declared = waveSpeed(x1, b1, context.lineContext.line.frequencyHz);
    // Values that vanish even in their product are no wave; other rules speak of them.
    if (!Number.isFinite(declared)) return [];
    const rounding =
      (roundingShare(context.circuit.declared.x1) + roundingShare(context.circuit.declared.b1)) / 2;
    if (declared <= Math.max(FASTEST_WAVE, 1 / Math.max(1 - rounding, 0.01))) return [];
    return [
      {
        grade: 'must-answer',
        parameter: 'waveSpeed',
        declared,
        ...(context.recomputed === null ? {} : { recomputed: context.recomputed.waveSpeed }),
        where: pointerOf(context, 'x1'),
        message: `X1 and B1 together give a wave at ${figure(declared)} of the speed of light. No overhead line is faster than light.`,
      },
    ];
  },
};
