import { SEQUENCE_KEYS } from '../../engine/index';
import type { Cause } from '../types';
import { PARAMETER_WORDS } from '../parameters';
import { quantity } from '../words';
import type { Cover } from './cover';
import type { Item } from './item';
import { inWords, logDensity, namesIn, scatterOf, score, worstResidual } from './item';
import type { Target } from './problem';

/** Most causes that one matter is given. */
export const MOST_CAUSES = 3;

/** A cause this much less likely (natural log) than the best is not worth a reader's time. */
const FAR_FETCHED = -14;

/** Log price of a violated constant that an alternative does not explain. */
const MISSED = -40;

/**
 * The causes of one matter, best first: the chosen slip, those that give the same correction, then the others that
 * explain the same constants, one for each code.
 *
 * @param chosen the slip that the cover chose
 * @param items every slip that fits what it touches
 * @param targets the problem's targets
 * @param honest remaining difference of each target when nothing is slipped
 * @param cover the cover, for the scatter of the filing
 */
export function causesOf(
  chosen: Item,
  items: readonly Item[],
  targets: readonly Target[],
  honest: readonly number[],
  cover: Cover,
): Cause[] {
  const best = new Map<string, { item: Item; lead: number }>();
  for (const item of items) {
    if (item.code === chosen.code || (item.explained & chosen.explained) === 0) continue;
    const lead = leadOver(chosen, item, targets, honest, cover.scatter);
    if (lead > (best.get(item.code)?.lead ?? FAR_FETCHED)) best.set(item.code, { item, lead });
  }
  const others = [...best.values()].sort(
    (a, b) => sameCorrection(b.item, chosen) - sameCorrection(a.item, chosen) || b.lead - a.lead,
  );
  const listed = [chosen, ...others.map(({ item }) => item)].slice(0, MOST_CAUSES);
  return listed.map((item) => toCause(item, targets));
}

function leadOver(
  chosen: Item,
  other: Item,
  targets: readonly Target[],
  honest: readonly number[],
  scatter: number,
): number {
  const value = (item: Item, rival: Item): number => {
    let total = score(item, targets, scatter);
    targets.forEach((target, index) => {
      const bit = 1 << index;
      if (item.touched & bit || !(rival.touched & bit)) return;
      const spread = scatterOf(target, scatter, 0);
      // What only the rival explains counts against an alternative, never against the slip that was chosen.
      if (!target.violated) total += logDensity(honest[index] ?? 0, spread);
      else total += item === chosen ? -Math.log(spread) : MISSED;
    });
    return total;
  };
  return value(other, chosen) - value(chosen, other);
}

function sameCorrection(item: Item, chosen: Item): number {
  if (item.in !== chosen.in || item.explained !== chosen.explained) return 0;
  const same = Object.entries(chosen.corrected).every(([key, value]) => {
    const other = item.corrected[key];
    return other !== undefined && Math.abs(other - value) <= 1e-6 * Math.abs(value);
  });
  return same ? 1 : 0;
}

/** An item as a report gives it. */
export function toCause(item: Item, targets: readonly Target[]): Cause {
  const residual = worstResidual(item);
  return {
    code: item.code,
    in: item.in,
    explains: namesIn(item.explained, targets),
    corrected: { ...item.corrected },
    ...(item.where === undefined ? {} : { where: item.where }),
    residual,
    sentence: `Fits within ${fitOf(residual)} if ${inWords(item.words)}${valuesIn(item)}.`,
  };
}

/** Most values that a sentence names; the table shows the others. */
const MOST_VALUES = 3;

/** How well a slip fits, rounded up to a tenth of a per cent: no reader's data are known better than that. */
function fitOf(residual: number): string {
  return `${Math.max(1, Math.ceil(residual * 1000 - 1e-6)) / 10}\u2009%`;
}

/** The values that a slip in the declared data gives, as they end its sentence. */
function valuesIn(item: Item): string {
  if (item.in !== 'declared') return '';
  const names = SEQUENCE_KEYS.filter((key) => item.corrected[key] !== undefined).slice(0, MOST_VALUES);
  const values = names.map(
    (key) => `${PARAMETER_WORDS[key].label} is ${quantity(key, item.corrected[key] ?? 0, 4)}`,
  );
  return values.length === 0 ? '' : `: ${values.join(', ')}`;
}
