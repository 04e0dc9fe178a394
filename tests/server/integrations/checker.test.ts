import { pathToFileURL } from 'node:url';
import { resolve } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { makeChecker } from '#server/integrations/checker';
import { checkFiling } from '#shared/checks/check-filing';
import { DEFAULT_RULE_SET } from '#shared/checks/defaults/rule-set';
import { readFiling } from '#shared/filing/read-filing';
import { STARTING_LIBRARY } from '#shared/library/conductors';

const checker = makeChecker(pathToFileURL(resolve(import.meta.dirname, '../../../server/main.ts')).href);
afterAll(() => checker.close());

const conductor = {
  name: 'C',
  model: 'handbook',
  diameterMm: 28.14,
  coreDiameterMm: 10.36,
  gmrMm: 11.37,
  acResistanceOhmPerKm: 0.0798,
};
const position = (phase: string, horizontalM: number) => ({
  circuit: 1,
  phase,
  conductor: 'phase',
  horizontalM,
  attachmentHeightM: 24,
  sagM: 9,
});
const filing = {
  lines: [
    {
      name: 'One',
      from: 'A',
      to: 'B',
      nominalVoltageKv: 138,
      frequencyHz: 60,
      sections: [
        {
          lengthKm: 40,
          conductors: { phase: conductor },
          positions: [position('a', -5), position('b', 0), position('c', 5)],
        },
      ],
      declared: [
        {
          circuit: 1,
          r1: { value: 0.08, unit: 'ohm/km' },
          x1: { value: 0.79, unit: 'ohm/km' },
          b1: { value: 3.4, unit: 'uS/km' },
        },
      ],
    },
  ],
};

function task() {
  const read = readFiling(filing, { library: STARTING_LIBRARY, owner: DEFAULT_RULE_SET.owner });
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  return { filing: read.filing, rules: DEFAULT_RULE_SET };
}

describe('the checker in a worker thread', () => {
  it('gives the very report that the check gives here', async () => {
    const report = await checker.check(task());
    expect(report.lines).toHaveLength(1);
    expect(report).toEqual(JSON.parse(JSON.stringify(checkFiling(task().filing, task().rules, {}))));
  });

  it('stops when it is told to', async () => {
    const stop = new AbortController();
    const running = checker.check(task(), stop.signal);
    stop.abort();
    await expect(running).rejects.toThrow(/abort/i);
    expect((await checker.check(task())).lines).toHaveLength(1);
  });
});
