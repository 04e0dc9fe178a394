/** One line of a benchmark: a value and the other one, measured in the same run, that it stands against. */
export interface BenchRow {
  name: string;
  value: number;
  unit: string;
  /** Name of the other measurement. */
  against: string;
  /** value ÷ the other's value. */
  ratio: number;
}

/** Shortest batch that the clock resolves well and that often runs undisturbed, ns. */
const BATCH_NS = 1e6;

function batchNs(call: (k: number) => void, from: number, calls: number): number {
  const start = process.hrtime.bigint();
  for (let k = from; k < from + calls; k++) call(k);
  return Number(process.hrtime.bigint() - start);
}

/**
 * Least mean time of one call over many short batches, ns: whatever else runs on the machine only adds.
 *
 * @param call receives a running number, so that every call can have other input
 * @param seconds how long to measure, after a quarter of it to warm up
 * @param least calls a batch holds at least
 */
export function leastNs(call: (k: number) => void, seconds = 0.8, least = 1): number {
  let k = 0;
  const run = (calls: number): number => {
    const ns = batchNs(call, k, calls);
    k += calls;
    return ns;
  };
  const warmUntil = performance.now() + 250 * seconds;
  let mean = run(1);
  while (performance.now() < warmUntil) mean = run(least) / least;
  const calls = Math.max(least, Math.ceil(BATCH_NS / mean));
  const until = performance.now() + 1000 * seconds;
  let best = Infinity;
  do best = Math.min(best, run(calls) / calls);
  while (performance.now() < until);
  return best;
}

/** A row from two measurements. */
export function row(name: string, value: number, unit: string, against: string, other: number): BenchRow {
  return { name, value, unit, against, ratio: value / other };
}
