import type { CauseCode } from '../types';
import { label } from '../words';
import type { Item } from './item';
import type { DeclaredParameter, Problem, Target } from './problem';
import { TIGHT, residual, unitFactor } from './problem';

interface Swap {
  code: CauseCode;
  one: DeclaredParameter;
  other: DeclaredParameter;
  prior: number;
}

/** Pairs of fields whose values people put into each other's place. */
const SWAPS: readonly Swap[] = [
  { code: 'r-x-swapped', one: 'r1', other: 'x1', prior: 0 },
  { code: 'r-x-swapped', one: 'r0', other: 'x0', prior: 0 },
  { code: 'r-x-swapped', one: 'r0m', other: 'x0m', prior: 0 },
  { code: 'sequence-swapped', one: 'r1', other: 'r0', prior: 0 },
  { code: 'sequence-swapped', one: 'x1', other: 'x0', prior: 0 },
  { code: 'sequence-swapped', one: 'b1', other: 'b0', prior: 0 },
  { code: 'x-b-swapped', one: 'x1', other: 'b1', prior: -0.3 },
  { code: 'x-b-swapped', one: 'x0', other: 'b0', prior: -0.3 },
];

interface Fit {
  code: CauseCode;
  prior: number;
  entries: { index: number; parameter: DeclaredParameter; value: number; difference: number }[];
  words: string;
}

/**
 * Values that stand in each other's field. The numbers change places and take the unit of their new field.
 *
 * @returns one item for each pair that fits, and one for each set of pairs with the same code
 */
export function swapItems(problem: Problem): Item[] {
  const fits = SWAPS.flatMap((swap) => fitOf(swap, problem));
  const single = fits.map(toItem);
  const joined = (['r-x-swapped', 'sequence-swapped', 'x-b-swapped'] as const).flatMap((code) => {
    const ofCode = fits.filter((fit) => fit.code === code);
    if (ofCode.length < 2) return [];
    const entries = ofCode.flatMap((fit) => fit.entries);
    return [toItem({ code, prior: ofCode[0]?.prior ?? 0, entries, words: joinedWords(code) })];
  });
  return [...single, ...joined];
}

function joinedWords(code: CauseCode): string {
  if (code === 'r-x-swapped') return 'R and X stand in each other’s place';
  if (code === 'x-b-swapped') return 'X and B stand in each other’s place';
  return 'positive and zero sequence stand in each other’s place';
}

function fitOf(swap: Swap, problem: Problem): Fit[] {
  const one = problem.targets.findIndex(({ parameter }) => parameter === swap.one);
  const other = problem.targets.findIndex(({ parameter }) => parameter === swap.other);
  const first = problem.targets[one];
  const second = problem.targets[other];
  if (first === undefined || second === undefined || !(first.violated || second.violated)) return [];
  const entries = [entry(one, first, second, problem), entry(other, second, first, problem)];
  if (entries.some(({ difference }) => Math.abs(difference) > TIGHT)) return [];
  const words = `${label(swap.one)} and ${label(swap.other)} stand in each other’s place`;
  return [{ code: swap.code, prior: swap.prior, entries, words }];
}

function entry(index: number, target: Target, from: Target, problem: Problem): Fit['entries'][number] {
  const value = from.value.value * unitFactor(target);
  const difference = residual(target, value, problem.base[target.parameter]);
  return { index, parameter: target.parameter, value, difference };
}

function toItem({ code, prior, entries, words }: Fit): Item {
  const mask = entries.reduce((sum, { index }) => sum | (1 << index), 0);
  return {
    code,
    in: 'declared',
    touched: mask,
    explained: mask,
    residuals: new Map(entries.map(({ index, difference }) => [index, difference])),
    corrected: Object.fromEntries(entries.map(({ parameter, value }) => [parameter, value])),
    prior,
    model: 0,
    freedom: 0,
    words,
  };
}
