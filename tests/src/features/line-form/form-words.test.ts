import { describe, expect, it } from 'vitest';
import { blankLine } from '../../../../src/features/line-form/model/blank';
import {
  changeSection,
  setCircuits,
  setGroundWires,
  setHeightUnit,
} from '../../../../src/features/line-form/model/edit';
import { inFormWords, outcomeInFormWords } from '../../../../src/features/line-form/model/form-words';

const METRE = blankLine();
const FEET = changeSection(METRE, 0, (s) => setHeightUnit(setGroundWires(s, 2), 'ft'));
const plain = (text: string): string => text.replace(/\u2009/g, ' ');
const APART =
  'The nearest phases, position 1 (phase a of circuit 1) and position 2 (phase b of circuit 1), hang 2.44\u2009m apart.';

describe('messages in the words of the form', () => {
  it('call positions as the form does', () => {
    expect(plain(inFormWords(METRE, 0, APART))).toBe(
      'The nearest phases, phase a and phase b, hang 2.44 m apart.',
    );
    expect(inFormWords(setCircuits(METRE, 2), 0, 'Position 5 (phase b of circuit 2) is low.')).toBe(
      'Phase 2b is low.',
    );
    expect(inFormWords(FEET, 0, 'Position 5 (a ground wire) is low.')).toBe('Ground wire 2 is low.');
  });

  it('speak feet where the form does, in as many digits (1 ft = 0.3048 m)', () => {
    expect(plain(inFormWords(FEET, 0, APART))).toContain('hang 8.01 ft apart');
    const others = 'at 345\u2009kV over 100\u2009Ω·m, 28.1\u2009mm, 12\u2009km';
    expect(inFormWords(FEET, 0, others)).toBe(others);
  });

  it('reach every finding about positions, and no other', () => {
    const finding = {
      where: '/lines/0/sections/0/positions/0',
      message: APART,
      causes: [{ sentence: '2.44 m' }],
    };
    const other = { where: '/lines/0/declared/0/x1', message: 'X1 is 3.00\u2009m.' };
    const said = outcomeInFormWords(FEET, { report: { findings: [finding, other] } });
    expect(plain(said.report.findings[0]?.message ?? '')).toContain('phase a and phase b, hang 8.01 ft');
    expect(said.report.findings[1]).toEqual(other);
    expect(finding.message).toBe(APART);
  });
});
