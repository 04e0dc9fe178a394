import { describe, expect, it } from 'vitest';
import { layOutMark } from '../../../../src/features/session/model/balanced-mark';
import { leadTo } from '../../../../src/features/session/model/lead-to';
import { addressWish, passwordWish } from '../../../../src/features/session/model/wishes';

describe('where a sign-in leads', () => {
  it('goes back to a page of ours', () => {
    expect(leadTo('/applications/27-0418?x=1', '/')).toBe('/applications/27-0418?x=1');
  });

  it.each([null, '', 'applications', 'https://x.example', '//x.example', '/\\x.example', '/sign-in?next=/'])(
    'goes home from %s',
    (next) => expect(leadTo(next, '/queue')).toBe('/queue'),
  );
});

describe('what the door asks for', () => {
  it('an address with an @, a password of twelve characters', () => {
    expect(addressWish('a@b')).toBeUndefined();
    expect(addressWish('ab')).toBeDefined();
    expect(addressWish(' ')).toBeDefined();
    expect(passwordWish('123456789012')).toBeUndefined();
    expect(passwordWish('12345678901')).toMatch(/11 are there/);
  });
});

describe('the mark as a drawing', () => {
  it.each([280, 640])('is in true balance at %i px: diameter² × arm alike on both sides', (width) => {
    const { discs, pivotX, beam } = layOutMark(width);
    const moments = discs.map((d) => (2 * d.radius) ** 2 * Math.abs(d.x - pivotX));
    expect(moments[0]).toBeCloseTo(moments[1] ?? 0, 6);
    discs.forEach((d) => {
      expect(d.x - d.radius).toBeGreaterThanOrEqual(beam[0]);
      expect(d.x + d.radius).toBeLessThanOrEqual(beam[1]);
    });
  });
});
