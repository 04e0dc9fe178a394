import { describe, expect, it } from 'vitest';
import type { Finding } from '#shared/contracts/api.generated';
import { conditionsOf } from '../../../../src/features/review/model/conditions';
import { draftFrom, raiseFaults, raiseRequest } from '../../../../src/features/review/model/raise';
import { replyActs } from '../../../../src/features/review/model/reply-acts';

const nameOf = (parameter: string) => parameter.toUpperCase();

const finding = (over: Partial<Finding>) =>
  ({
    fingerprint: 'f1',
    lineKey: 'L1',
    parameter: 'x1',
    grade: 'must-answer',
    message: 'X1 is 61 % above what the geometry gives: 0.613 Ω/km declared.',
    causes: [],
    follows: null,
    ...over,
  }) as Finding;

const cause = {
  sentence: 'Fits within 0.1 % if the value is per mile.',
  explains: ['x1'],
} as Finding['causes'][number];

describe('a discrepancy from findings', () => {
  it('is named after the values and the line, and begins with what is found and its cause', () => {
    const draft = draftFrom([finding({ causes: [cause] })], nameOf);
    expect(draft.title).toBe('X1 of L1');
    expect(draft.question).toBe(
      'X1 is 61 % above what the geometry gives. Fits within 0.1 % if the value is per mile.',
    );
    expect(draft.wanted).toMatch(/corrected value/);
  });

  it('may take several findings of several lines; what follows from another value names nothing', () => {
    const draft = draftFrom(
      [
        finding({ causes: [cause] }),
        finding({
          fingerprint: 'f2',
          parameter: 'b1',
          lineKey: 'L3',
          message: 'B1 is half.',
          causes: [cause],
        }),
        finding({ fingerprint: 'f3', parameter: 'wavespeed', follows: 'x1', message: 'Too slow.' }),
      ],
      nameOf,
    );
    expect(draft.title).toBe('X1 and B1 of L1 and L3');
    expect(draft.question).not.toContain('Too slow');
    expect(draft.question.match(/per mile/g)).toHaveLength(1);
    expect(draft.fingerprints).toEqual(['f1', 'f2', 'f3']);
  });

  it('names every value that one matter explains', () => {
    const wide = { ...cause, explains: ['r1', 'x1', 'b1'] };
    expect(draftFrom([finding({ parameter: 'r1', causes: [wide] })], nameOf).title).toBe(
      'R1, X1 and B1 of L1',
    );
  });

  it('asks for a sentence only where nothing must be answered', () => {
    expect(draftFrom([finding({ grade: 'explain' })], nameOf).wanted).toMatch(/sentence/);
  });

  it('begins empty by hand, and says what is missing', () => {
    const draft = draftFrom([], nameOf);
    expect(draft.title).toBe('');
    expect(raiseFaults(draft).map((f) => f.field)).toEqual(['title', 'question']);
    expect(raiseFaults({ ...draft, title: 'Earth', question: 'Which resistivity?' })).toEqual([]);
  });

  it('sends what is filled in, on the revision that was read', () => {
    const draft = { ...draftFrom([], nameOf), title: ' Earth ', question: 'Which?', wanted: ' ' };
    expect(raiseRequest(draft, 'B')).toEqual({ revision: 'B', title: 'Earth', question: 'Which?' });
    expect(raiseRequest(draftFrom([finding({})], nameOf), 'B')).toMatchObject({
      fingerprints: ['f1'],
      lineKeys: ['L1'],
    });
  });
});

describe('words of a reviewer', () => {
  it('ask again or accept an answer, and can always reopen what is closed', () => {
    expect(replyActs('answered').map((a) => a.act)).toEqual(['reopen', 'settle', 'remark']);
    expect(replyActs('open').some((a) => a.act === 'reopen')).toBe(false);
    expect(replyActs('settled').map((a) => a.act)).toContain('reopen');
  });

  it('become conditions one a line', () => {
    expect(conditionsOf(' As-built data before energising \n\n Rating confirmed\n')).toEqual([
      'As-built data before energising',
      'Rating confirmed',
    ]);
    expect(conditionsOf('  ')).toEqual([]);
  });
});
