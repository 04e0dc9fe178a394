import { describe, expect, it } from 'vitest';
import { closestNames, didYouMean, editDistance, nearestNames } from '#shared/contracts/nearest';
import { STARTING_LIBRARY } from '#shared/library/conductors';

describe('nearest names', () => {
  it('counts changes of single characters, a swap as one', () => {
    expect(editDistance('kitten', 'sitting', 5)).toBe(3);
    expect(editDistance('Darke', 'Drake', 5)).toBe(1);
    expect(editDistance('abc', 'abc', 2)).toBe(0);
    expect(editDistance('abcdef', 'uvwxyz', 2)).toBe(3);
  });

  it('finds conductors by a slip of the pen, by case, by a part of the name', () => {
    const names = STARTING_LIBRARY.conductors.map((c) => c.name);
    expect(nearestNames('Darke', names)[0]).toBe('Drake');
    expect(nearestNames('CARDINAL', names)[0]).toBe('Cardinal');
    expect(nearestNames('243-AL1/39', names)[0]).toBe('243-AL1/39-ST1A');
    expect(nearestNames('3/8 steel', names)).toContain('3/8 in EHS 7-strand steel');
    expect(nearestNames('Zzyzx Special 9', names)).toEqual([]);
    expect(nearestNames('x'.repeat(100_000), names)).toEqual([]);
  });

  it('finds the closest in spelling where none is near, and gives up on what is no name', () => {
    expect(closestNames('Drxkq', ['Cardinal', 'Drake', 'Hawk'], 2)).toEqual(['Drake', 'Hawk']);
    const names = STARTING_LIBRARY.conductors.map((c) => c.name);
    expect(closestNames('Zzyzx Special 9', names)).toHaveLength(3);
    expect(closestNames('x'.repeat(81), names)).toEqual([]);
  });

  it('says them in a sentence, or nothing', () => {
    expect(didYouMean('lenghtKm', ['lengthKm', 'name'])).toBe(' Did you mean lengthKm?');
    expect(didYouMean('ohm', ['ohm/km', 'ohm/mi', 'ohm/kft'])).toBe(
      ' Did you mean ohm/km, ohm/mi or ohm/kft?',
    );
    expect(didYouMean('q', ['a', 'b'])).toBe('');
  });
});
