import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readFiling } from '#shared/filing/read-filing';
import { changed, CONTEXT, example, faultsOf } from './sample';
import type { Line } from './sample';
import { BREAKS } from './fault-cases';

const section = (l: Line) => l['sections'][0];
const at = '/lines/0/sections/0';
const FOLLOWED = new Set(['a doubled phase', 'circuit 2 without circuit 1', 'a cable with positions']);

describe('each fault stands where it is to be mended', () => {
  it.each(BREAKS)('%s', (name, change, pointer, words) => {
    const faults = faultsOf(changed(change));
    const own = faults.filter((f) => f.startsWith(`${pointer}: `));
    expect(own).toHaveLength(1);
    expect(own[0]).toMatch(words);
    // Nothing else is told but what follows from the same slip.
    expect(faults.length).toBeLessThanOrEqual(FOLLOWED.has(name) ? 5 : 1);
  });

  it('and the example before it was broken has none', () => {
    expect(faultsOf(example())).toEqual([]);
  });

  it('takes a spacing of nought for a single conductor', () => {
    const single = { bundleCount: 1, bundleSpacingM: 0 };
    expect(faultsOf(changed((l) => Object.assign(section(l).positions[0], single)))).toEqual([]);
  });

  it('refuses a key that would be a prototype', () => {
    const json = JSON.parse('{"lines": [{"__proto__": {"name": "x"}}]}') as unknown;
    expect(faultsOf(json)).toContain('/lines/0/__proto__: “__proto__” is a name that cannot be used.');
  });
});

describe('one fault hides no other', () => {
  it('schema, rules and library of one line are told together', () => {
    const json = changed((l) => {
      l['frequencyHz'] = 55;
      delete l['declared'][0].b1;
      section(l).conductors.phase = { library: 'Darke', temperatureC: 50 };
      section(l).positions[0].horizontalM = 'left';
      section(l).positions.splice(2, 1);
    });
    const pointers = faultsOf(json).map((f) => f.split(': ')[0]);
    expect(pointers).toEqual([
      '/lines/0/declared/0/b1',
      '/lines/0/frequencyHz',
      `${at}/conductors/phase/library`,
      `${at}/positions`,
      `${at}/positions/0/horizontalM`,
    ]);
  });
});

describe('whatever is sent', () => {
  const isListed = (json: unknown) => {
    const read = readFiling(json, CONTEXT);
    if (read.ok) return;
    expect(read.faults.length).toBeGreaterThan(0);
    for (const f of read.faults) {
      expect(f.pointer).toMatch(/^(\/|$)/);
      expect(f.expected).not.toBe('');
      expect(f.message).toMatch(/[.?]$/);
      expect(JSON.stringify(f.value)).toBeDefined();
    }
  };

  it('is taken or answered with listed faults', { timeout: 30_000 }, () => {
    fc.assert(fc.property(fc.jsonValue({ maxDepth: 6 }), isListed), { numRuns: 300 });
    fc.assert(
      fc.property(fc.array(fc.jsonValue(), { maxLength: 3 }), (lines) => isListed({ lines })),
      { numRuns: 300 },
    );
  });

  it('also in any one field of a sound filing', { timeout: 30_000 }, () => {
    const leaves: string[][] = [];
    const walk = (value: unknown, path: string[]) => {
      leaves.push(path);
      if (typeof value === 'object' && value !== null)
        for (const [k, v] of Object.entries(value)) walk(v, [...path, k]);
    };
    walk(example(), []);
    const odd = fc.oneof(
      fc.jsonValue({ maxDepth: 2 }),
      fc.constantFrom<unknown>(1e308, -1e308, 5e-324, -0, NaN, Infinity, '', 'a', true, null, [], {}),
    );
    fc.assert(
      fc.property(fc.constantFrom(...leaves.slice(1)), odd, (path, value) => {
        const json = example();
        const parent = path.slice(0, -1).reduce<Line>((o, k) => o[k] as Line, json);
        parent[path.at(-1) ?? ''] = value;
        isListed(json);
      }),
      { numRuns: 600 },
    );
  });

  it('is cut off when one line holds more than any could, or nests too deeply', () => {
    const many = changed((l) => (l['declared'] = Array.from({ length: 250_000 }, () => 1)));
    expect(faultsOf(many)).toEqual(['/lines/0: There is more here than one line can hold.']);
    let deep: unknown = 1;
    for (let i = 0; i < 5000; i++) deep = [deep];
    expect(faultsOf(changed((l) => (l['declared'] = deep)))[0]).toContain('nested more than 32 levels');
  });

  it('is not listed without end', { timeout: 30_000 }, () => {
    const read = readFiling({ lines: Array.from({ length: 12_000 }, () => 1) }, CONTEXT);
    expect(!read.ok && read.faults.length).toBe(5001);
    expect(!read.ok && read.faults.at(-1)?.message).toContain('more faults than the 5000');
  });
});
