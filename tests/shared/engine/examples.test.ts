import { readdirSync, readFileSync } from 'node:fs';
import { runInNewContext } from 'node:vm';
import { describe, expect, it } from 'vitest';
import * as engine from '#shared/engine/index';

/** The examples in the engine's docstrings: `expression // → value`, run as they stand. */

const FOLDER = new URL('../../../shared/engine/', import.meta.url);

const examples = readdirSync(FOLDER)
  .filter((name) => name.endsWith('.ts'))
  .flatMap((name) => {
    const text = readFileSync(new URL(name, FOLDER), 'utf8');
    return [...text.matchAll(/^ \* (\S.*) \/\/ → (.+)$/gm)].map((m) => ({
      name,
      code: m[1] ?? '',
      wanted: m[2] ?? '',
    }));
  });

/** Numbers in the value are read to the digits printed. */
function agrees(value: unknown, wanted: unknown): boolean {
  if (typeof value === 'number' && typeof wanted === 'number')
    return Math.abs(value - wanted) <= 1e-3 * Math.abs(wanted);
  return JSON.stringify(value) === JSON.stringify(wanted);
}

describe('examples in docstrings', () => {
  it('exist', () => {
    expect(examples.length).toBeGreaterThanOrEqual(5);
  });

  it.each(examples)('$name: $code', ({ code, wanted }) => {
    const value: unknown = runInNewContext(`(${code})`, { ...engine });
    expect(agrees(value, JSON.parse(wanted)), `${String(value)} against ${wanted}`).toBe(true);
  });
});
