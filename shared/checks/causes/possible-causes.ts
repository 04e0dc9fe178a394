import { matchClass, nominalVoltages } from '../bands/match-class';
import type { CircuitContext } from '../context';
import { waveSpeed } from '../derive';
import type { Band } from '../rule-set';
import type { BandParameter, LineParameter } from '../parameters';
import type { Cause } from '../types';
import { figure } from '../words';
import { MOST_CAUSES } from './alternatives';
import type { Problem, Target } from './problem';
import { inWords } from './item';
import { TIGHT } from './problem';
import { factorSlips } from './unit-slips';
import type { FactorSlip } from './unit-slips';

/** Wave speed that most overhead lines come near, a fraction of light's. */
const USUAL_SPEED = 0.977;

/** Price of one more constant that slipped, of a value that leaves its typical range, and of speed off the usual. */
const PRICES = { constant: -1, atypical: -1.5, speed: 0.012 } as const;

interface Trial {
  slips: { target: Target; slip: FactorSlip; value: number }[];
  score: number;
  speed: number;
}

/**
 * Slips that could lie behind a wave speed or a band that X1 and B1 leave, where there is no geometry to hold them
 * against: those that bring wave speed, X1 and B1 back into the class's typical range.
 *
 * @param context a circuit without recomputed values
 * @returns at most three, each marked as possible
 */
export function possibleCauses(context: CircuitContext): Cause[] {
  const { line, rules } = context.lineContext;
  const bands = matchClass(rules.bands, line.nominalVoltageKv, line.frequencyHz)?.bands ?? new Map();
  const problem = problemOf(context);
  const [x1, b1] = (['x1', 'b1'] as const).map((name) =>
    problem.targets.find(({ parameter }) => parameter === name),
  );
  if (x1 === undefined || b1 === undefined || x1.declared <= 0 || b1.declared <= 0) return [];
  const own = (target: Target): (FactorSlip | null)[] => [null, ...factorSlips(target, problem)];
  const trials: Trial[] = [];
  for (const forX of own(x1)) {
    for (const forB of own(b1)) {
      // Two unlike slips at once explain too much without a geometry to say so.
      if (forX !== null && forB !== null && (forX.code !== forB.code || forX.key !== forB.key)) continue;
      if (forX === null && forB === null) continue;
      const trial = trialOf(x1, forX, b1, forB, bands, line.frequencyHz);
      if (trial !== null) trials.push(trial);
    }
  }
  return bestOfEachCode(trials).map((trial) => toCause(trial));
}

function problemOf({ circuit, lineContext }: CircuitContext): Problem {
  const { line, rules } = lineContext;
  const targets = (['x1', 'b1'] as const).flatMap((parameter): Target[] => {
    const value = circuit.declared[parameter];
    return value === undefined
      ? []
      : [{ parameter, value, declared: value.perKm, violated: true, rounding: 0, formRatio: 1 }];
  });
  return {
    targets,
    base: {},
    lengthKm: line.lengthKm,
    frequencyHz: line.frequencyHz,
    nominalVoltageKv: line.nominalVoltageKv,
    classesKv: nominalVoltages(rules.bands),
  };
}

function trialOf(
  x1: Target,
  forX: FactorSlip | null,
  b1: Target,
  forB: FactorSlip | null,
  bands: ReadonlyMap<BandParameter, Band>,
  frequencyHz: number,
): Trial | null {
  const x = x1.declared * (forX?.factor ?? 1);
  const b = b1.declared * (forB?.factor ?? 1);
  const speed = waveSpeed(x, b, frequencyHz);
  const range = bands.get('waveSpeed');
  const [low, high] = range?.typical ?? [0.955, 0.995];
  if (speed < low || speed > high) return null;
  let score = (forX?.prior ?? 0) + (forB?.prior ?? 0) - ((speed - USUAL_SPEED) / PRICES.speed) ** 2 / 2;
  const weighed: [BandParameter, number][] = [
    ['x1', x],
    ['b1', b],
    ['surgeImpedanceOhm', Math.sqrt(x / (b * 1e-6))],
  ];
  for (const [parameter, value] of weighed) {
    const band = bands.get(parameter);
    if (band === undefined) continue;
    if (value < band.outer[0] || value > band.outer[1]) return null;
    if (value < band.typical[0] || value > band.typical[1]) score += PRICES.atypical;
  }
  const slips: Trial['slips'] = [];
  if (forX !== null) slips.push({ target: x1, slip: forX, value: x });
  if (forB !== null) slips.push({ target: b1, slip: forB, value: b });
  // The same base or unit over both is one slip; its price counts once.
  if (slips.length === 2) score -= Math.min(forX?.prior ?? 0, forB?.prior ?? 0);
  return { slips, score: score + PRICES.constant * (slips.length - 1), speed };
}

function bestOfEachCode(trials: readonly Trial[]): Trial[] {
  const best = new Map<string, Trial>();
  for (const trial of trials) {
    const code = trial.slips[0]?.slip.code ?? '';
    if (trial.score > (best.get(code)?.score ?? -Infinity)) best.set(code, trial);
  }
  return [...best.values()].sort((a, b) => b.score - a.score).slice(0, MOST_CAUSES);
}

function toCause({ slips, speed }: Trial): Cause {
  const first = slips[0];
  const words = inWords(first?.slip.words ?? '');
  return {
    code: first?.slip.code ?? 'decimal-shift',
    in: 'declared',
    explains: slips.map(({ target }) => target.parameter as LineParameter),
    corrected: Object.fromEntries(slips.map(({ target, value }) => [target.parameter, value])),
    // Without geometry nothing is left to differ from but the usual speed; offered only inside the typical range.
    residual: Math.min(TIGHT, Math.abs(speed / USUAL_SPEED - 1)),
    possible: true,
    sentence: `Possible if ${words}: the wave would run at ${figure(speed)} of the speed of light, inside the band.`,
  };
}
