import { describe, expect, it } from 'vitest';
import { importFault } from './layers';
import { productFiles } from './source-files';

describe('layers', () => {
  it('imports run downwards only', () => {
    const faults = productFiles().flatMap((file) =>
      file.imports.flatMap(({ target, line }) => {
        const fault = target && !target.endsWith('.css') ? importFault(file.path, target) : null;
        return fault ? [`${file.path}:${line} → ${target}: ${fault}`] : [];
      }),
    );
    expect(faults).toEqual([]);
  });

  it('sees a wrong import when there is one', () => {
    expect(importFault('shared/engine/solve.ts', 'shared/checks/rules.ts')).toMatch(/upwards/);
    expect(importFault('src/lib/api.ts', 'server/config/read.ts')).toMatch(/client code imports server/);
    expect(importFault('src/features/queue/api.ts', 'src/features/review/api.ts')).toMatch(/another feature/);
    expect(importFault('shared/nowhere/x.ts', 'shared/units/y.ts')).toMatch(/no room/);
  });

  it('shared code names no package but the ones that run anywhere', () => {
    const allowed = new Set(['@casl/ability', '@casl/ability/extra']);
    const faults = productFiles()
      .filter((f) => f.path.startsWith('shared/'))
      .flatMap((f) =>
        f.imports
          .filter((i) => i.target === null && !i.typeOnly && !allowed.has(i.specifier))
          .map((i) => `${f.path}:${i.line} ${i.specifier}`),
      );
    expect(faults).toEqual([]);
  });

  it('has no import cycle', () => {
    const graph = new Map(
      productFiles().map((f) => [f.path, f.imports.filter((i) => !i.typeOnly).map((i) => i.target)]),
    );
    const state = new Map<string, 'open' | 'done'>();
    const cycles: string[] = [];
    const walk = (path: string, trail: string[]): void => {
      if (state.get(path) === 'done') return;
      if (state.get(path) === 'open') {
        cycles.push([...trail.slice(trail.indexOf(path)), path].join(' → '));
        return;
      }
      state.set(path, 'open');
      for (const next of graph.get(path) ?? []) if (next && graph.has(next)) walk(next, [...trail, path]);
      state.set(path, 'done');
    };
    for (const path of graph.keys()) walk(path, []);
    expect(cycles).toEqual([]);
  });
});
