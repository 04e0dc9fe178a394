import { uncertainty } from '../engine/index';
import type { LineUncertainty } from '../engine/index';
import type { NormalisedLine } from '../filing/types';
import type { Recomputation, Spread } from './context';
import type { Uncertainties } from './rule-set';

/** What the inputs are called in sentences. */
const INPUT_WORDS = {
  height: 'heights',
  sag: 'sags',
  offset: 'offsets',
  diameter: 'conductor diameter',
  gmr: 'GMR',
  'ac-resistance': 'a.c. resistance',
  temperature: 'conductor temperature',
  'ground-wire-resistance': 'ground-wire resistance',
  'earth-resistivity': 'earth resistivity',
} as const;

/**
 * What a line's geometry gives, with the range that its inputs leave.
 *
 * @param line the line as read
 * @param uncertainties how exactly the inputs are known
 * @returns the constants and their spreads; a failure of null when a section owes its geometry
 */
export function recompute(line: NormalisedLine, uncertainties: Uncertainties): Recomputation {
  if (line.engineInput === null) return { ok: false, failure: null };
  const result = uncertainty(line.engineInput, uncertainties);
  if (!result.ok) return { ok: false, failure: result };
  const { constants, circuits, mutual } = result.value;
  return {
    ok: true,
    constants,
    spreads: {
      circuits: circuits.map((of) => ({
        r1: spread(of.r1),
        x1: spread(of.x1),
        b1: spread(of.b1),
        r0: spread(of.r0),
        x0: spread(of.x0),
        b0: spread(of.b0),
      })),
      mutual: mutual.map((of) => ({ r0m: spread(of.r0m), x0m: spread(of.x0m), b0m: spread(of.b0m) })),
    },
  };
}

type EngineSpread = LineUncertainty['circuits'][number]['r1'];

function spread({ halfRange, dominant }: EngineSpread): Spread {
  return { halfRange, dominant: dominant === null ? 'none' : INPUT_WORDS[dominant] };
}
