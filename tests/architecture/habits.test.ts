import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { LAYERS } from './layers';
import { listFiles, productFiles } from './source-files';

/** Places of a pattern in the product's files, as path:line text. */
function places(pattern: RegExp, where: (path: string) => boolean): string[] {
  return productFiles()
    .filter((f) => where(f.path))
    .flatMap((f) =>
      f.text
        .split('\n')
        .flatMap((text, i) => (pattern.test(text) ? [`${f.path}:${i + 1} ${text.trim()}`] : [])),
    );
}

describe('habits', () => {
  it('the environment is read in server/config and in the scripts alone', () => {
    const elsewhere = (p: string) => !p.startsWith('server/config/') && !p.startsWith('server/scripts/');
    expect(places(/process\.env/, elsewhere)).toEqual([]);
  });

  it('colours stand in the palette alone', () => {
    const colour = /#[0-9a-f]{6}\b|#[0-9a-f]{3}\b(?=['"`;])|\b(rgb|rgba|hsl|oklch)\(/i;
    expect(places(colour, (p) => p !== 'shared/format/palette.ts')).toEqual([]);
    const css = listFiles(/^src\/.*\.css$/).filter((f) => colour.test(readFileSync(f, 'utf8')));
    expect(css).toEqual([]);
  });

  it("no query key is written outside a feature's api folder or src/lib", () => {
    const elsewhere = (p: string) => p.startsWith('src/') && !/^src\/(features\/[^/]+\/api|lib)\//.test(p);
    expect(places(/queryKey:\s*\[/, elsewhere)).toEqual([]);
  });

  it('barrels: only the engine has a front door', () => {
    const barrels = productFiles()
      .filter((f) => /\/index\.tsx?$/.test(f.path))
      .map((f) => f.path);
    expect(barrels).toEqual(['shared/engine/index.ts']);
  });

  it('every room is named in DEVELOPERS.md', () => {
    const guide = readFileSync('DEVELOPERS.md', 'utf8');
    const names = LAYERS.map((r) => r.path.split('/').at(-1) ?? '');
    expect(names.filter((n) => !guide.includes(`${n}/`) && !guide.includes(n))).toEqual([]);
  });

  it('every top-level folder of code is a room', () => {
    const top = new Set(
      productFiles()
        .map((f) => f.path.split('/').slice(0, 2).join('/'))
        .filter((p) => !/\.(ts|tsx)$/.test(p)),
    );
    const known = (p: string) => LAYERS.some((r) => r.path === p || r.path.startsWith(`${p}/`));
    expect([...top].filter((p) => !known(p))).toEqual([]);
  });
});

describe('schemas', () => {
  /** Every number of a schema says its unit (or that it is a count or a ratio) and has a range, or says that it has none. */
  function numberFaults(node: unknown, path: string): string[] {
    if (Array.isArray(node)) return node.flatMap((n, i) => numberFaults(n, `${path}/${i}`));
    if (typeof node !== 'object' || node === null) return [];
    const schema = node as Record<string, unknown>;
    const nested = Object.entries(schema).flatMap(([k, v]) => numberFaults(v, `${path}/${k}`));
    if (schema['type'] !== 'number' && schema['type'] !== 'integer') return nested;
    const text = String(schema['description'] ?? '');
    const bounded =
      ('minimum' in schema || 'exclusiveMinimum' in schema) &&
      ('maximum' in schema || 'exclusiveMaximum' in schema);
    const faults = [
      ...(text ? [] : [`${path}: no description with the unit`]),
      ...(bounded || /unbounded/i.test(text) || 'enum' in schema
        ? []
        : [`${path}: no range and not "unbounded"`]),
    ];
    return [...nested, ...faults];
  }

  it('finds a number without unit or range', () => {
    expect(numberFaults({ properties: { x: { type: 'number' } } }, '')).toHaveLength(2);
    expect(numberFaults({ type: 'number', description: 'km', minimum: 0, maximum: 1 }, '')).toEqual([]);
  });

  it('each number has its unit and a range', () => {
    const faults = listFiles(/^schemas\/.*\.json$/).flatMap((f) =>
      numberFaults(JSON.parse(readFileSync(f, 'utf8')), f),
    );
    expect(faults).toEqual([]);
  });
});
