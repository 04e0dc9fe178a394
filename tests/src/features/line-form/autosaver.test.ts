import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { Autosaver } from '../../../../src/features/line-form/model/autosaver';
import type { SaveState, SavedVersion } from '../../../../src/features/line-form/model/autosaver';

class Stale extends Error {}

/** A server that keeps one value with its version, and may be told to refuse. */
function server() {
  const kept = { version: 3, value: 'opened', saves: [] as string[], down: false };
  const save = (value: string, version: number): Promise<SavedVersion> =>
    new Promise((resolve, reject) => {
      setTimeout(() => {
        if (kept.down) return reject(new Error('unreachable'));
        if (version !== kept.version) return reject(new Stale());
        kept.version += 1;
        kept.value = value;
        kept.saves.push(value);
        resolve({ version: kept.version, at: new Date(0) });
      }, 100);
    });
  return { kept, save };
}

function setUp() {
  const states: SaveState[] = [];
  const { kept, save } = server();
  const settled = vi.fn();
  const saver = new Autosaver<string>(3, {
    save,
    isConflict: (e) => e instanceof Stale,
    onState: (s) => states.push(s),
    onSettled: settled,
    delayMs: 800,
    retryMs: 5000,
  });
  return { kept, saver, states, settled, kinds: () => states.map((s) => s.kind) };
}

beforeEach(() => vi.useFakeTimers());
afterEach(() => vi.useRealTimers());

describe('autosave', () => {
  it('sends the last value once the typing pauses', async () => {
    const { kept, saver, kinds, settled } = setUp();
    'abc'.split('').forEach((_, i, all) => saver.change(all.slice(0, i + 1).join('')));
    await vi.advanceTimersByTimeAsync(2000);
    expect(kept.saves).toEqual(['abc']);
    expect(kinds()).toEqual(['waiting', 'waiting', 'waiting', 'saving', 'saved']);
    expect(settled).toHaveBeenCalledTimes(1);
  });

  it('sends what was typed during a save afterwards, on top of the new version', async () => {
    const { kept, saver, settled } = setUp();
    saver.change('one');
    await vi.advanceTimersByTimeAsync(850);
    saver.change('two');
    await vi.advanceTimersByTimeAsync(3000);
    expect(kept.saves).toEqual(['one', 'two']);
    expect(saver.base).toBe(5);
    expect(settled).toHaveBeenCalledTimes(1);
  });

  it('flush waits until everything has arrived', async () => {
    const { kept, saver } = setUp();
    saver.change('one');
    const done = saver.flush();
    await vi.advanceTimersByTimeAsync(50);
    saver.change('two');
    await vi.advanceTimersByTimeAsync(1000);
    await done;
    expect(kept.value).toBe('two');
  });

  it('stops at a conflict and sends nothing more until somebody chose', async () => {
    const { kept, saver, kinds } = setUp();
    kept.version = 7;
    saver.change('mine');
    await vi.advanceTimersByTimeAsync(1000);
    saver.change('mine, longer');
    await vi.advanceTimersByTimeAsync(60_000);
    expect(kinds().at(-1)).toBe('conflict');
    expect(kept.saves).toEqual([]);
    const done = saver.keepMine(7, 'mine, longer');
    await vi.advanceTimersByTimeAsync(1000);
    await done;
    expect(kept.saves).toEqual(['mine, longer']);
    expect(kinds().at(-1)).toBe('saved');
  });

  it('after taking the other’s value it builds on their version', async () => {
    const { kept, saver } = setUp();
    kept.version = 7;
    saver.change('mine');
    await vi.advanceTimersByTimeAsync(1000);
    saver.takeTheirs({ version: 7, at: new Date(0) });
    saver.change('theirs and mine');
    await vi.advanceTimersByTimeAsync(1000);
    expect(kept.saves).toEqual(['theirs and mine']);
  });

  it('goes on with what waits when the conflict was with a save of its own', async () => {
    const { kept, saver } = setUp();
    kept.version = 4;
    saver.change('mine');
    await vi.advanceTimersByTimeAsync(1000);
    saver.change('mine, longer');
    const done = saver.goOn(4);
    await vi.advanceTimersByTimeAsync(1000);
    await done;
    expect(kept.saves).toEqual(['mine, longer']);
  });

  it('tries again by itself after a failure, with what stands in the form by then', async () => {
    const { kept, saver, kinds } = setUp();
    kept.down = true;
    saver.change('one');
    await vi.advanceTimersByTimeAsync(1000);
    expect(kinds().at(-1)).toBe('failed');
    kept.down = false;
    await vi.advanceTimersByTimeAsync(6000);
    expect(kept.saves).toEqual(['one']);
    expect(kinds().at(-1)).toBe('saved');
  });
});
