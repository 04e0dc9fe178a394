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

/**
 * Least time of one call over several batches, ns. The least, since everything else on the machine only adds.
 *
 * @param call receives a running number, so that every call can have other input
 * @param calls calls a batch
 * @param batches number of batches, of which the first warm up
 */
export function leastNs(call: (k: number) => void, calls: number, batches = 25): number {
  let least = Infinity;
  for (let b = 0; b < batches; b++) {
    const start = process.hrtime.bigint();
    for (let k = 0; k < calls; k++) call(k);
    least = Math.min(least, Number(process.hrtime.bigint() - start) / calls);
  }
  return least;
}

/** A row from two measurements. */
export function row(name: string, value: number, unit: string, against: string, other: number): BenchRow {
  return { name, value, unit, against, ratio: value / other };
}
