import { describe, expect, it } from 'vitest';
import { canonicalFilingText, canonicalJson } from '#shared/filing/canonical';
import { readFiling } from '#shared/filing/read-filing';
import { changed, CONTEXT, example } from './sample';
import type { Line } from './sample';

function textOf(json: unknown): string {
  const read = readFiling(json, CONTEXT);
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  return canonicalFilingText(read.filing);
}

describe('canonical JSON', () => {
  it('of RFC 8785, section 3.2.2: numbers and escapes', () => {
    const source = String.raw`{
      "numbers": [333333333.33333329, 1E30, 4.50, 2e-3, 0.000000000000000000000000001],
      "string": "\u20ac$\u000F\u000aA'\u0042\u0022\u005c\\\"\/",
      "literals": [null, true, false]
    }`;
    expect(canonicalJson(JSON.parse(source))).toBe(
      String.raw`{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],"string":"€$\u000f\nA'B\"\\\\\"/"}`,
    );
  });

  it('of RFC 8785, section 3.2.3: keys by UTF-16 units', () => {
    const value = { '€': 1, '\r': 2, '\ufb33': 3, '1': 4, '😀': 5, '\u0080': 6, ö: 7 };
    expect([...canonicalJson(value).matchAll(/:(\d)/g)].map((m) => m[1]).join('')).toBe('2467153');
  });

  it('has no minus nought, and refuses what is no number', () => {
    expect(canonicalJson([-0, { a: undefined }])).toBe('[0,{}]');
    expect(() => canonicalJson(NaN)).toThrow();
  });
});

describe('the text that a content hash is taken of', () => {
  const same: [string, (l: Line) => void][] = [
    ['defaults written out or left out', (l) => delete l['transposed']],
    ['another order of positions', (l) => l['sections'][0].positions.reverse()],
    [
      'another name of a conductor’s key',
      (l) => {
        const s = l['sections'][0];
        s.conductors = { wire: s.conductors.phase, sky: s.conductors.ground };
        for (const p of s.positions) p.conductor = p.groundWire ? 'sky' : 'wire';
      },
    ],
  ];

  it.each(same)('does not change with %s', (_name, change) => {
    expect(textOf(changed(change))).toBe(textOf(example()));
  });

  it('does not change with another order of keys', () => {
    const shuffled = changed((l) => {
      for (const key of Object.keys(l).reverse()) {
        const value = l[key] as unknown;
        delete l[key];
        l[key] = value;
      }
    });
    expect(textOf(shuffled)).toBe(textOf(example()));
  });

  it('is the same for one value in uF/km and nF/km', () => {
    const one = changed((l) => (l['declared'][0].b1 = { value: 2, unit: 'uF/km' }));
    const two = changed((l) => (l['declared'][0].b1 = { value: 2000, unit: 'nF/km' }));
    expect(textOf(one)).toBe(textOf(two));
  });

  const different: [string, (l: Line) => void][] = [
    ['a declared value', (l) => (l['declared'][0].x1.value = 0.6136)],
    ['a value of the whole line for one per length', (l) => (l['declared'][0].x1.unit = 'ohm')],
    ['a coordinate', (l) => (l['sections'][0].positions[0].horizontalM = -9.01)],
    ['a conductor’s datum', (l) => (l['sections'][0].conductors.phase.gmrMm = 11.38)],
    ['bonding', (l) => (l['sections'][0].groundWireBonding = 'segmented')],
    ['the basis', (l) => (l['declared'][0].basis.engineer = 'S. Holt')],
    ['a ground wire less', (l) => l['sections'][0].positions.pop()],
    ['the name', (l) => (l['name'] = 'Sarn – Harrow Fell')],
  ];

  it.each(different)('changes with %s', (_name, change) => {
    expect(textOf(changed(change))).not.toBe(textOf(example()));
  });
});
