import { describe, expect, it } from 'vitest';
import type { Application } from '#shared/contracts/api.generated';
import { countOpen, headSteps, isOpen, returnLabel } from '../../../../src/features/review/model/head-steps';

type Step = Application['steps'][number];
const step = (name: Step['step'], reason: string | null = null): Step => ({
  step: name,
  open: reason === null,
  reason,
});

const IN_REVIEW: Step[] = [
  step('take', 'M. Thornholt has it already.'),
  step('hand-over'),
  step('put-back'),
  step('return'),
  step('raise'),
  step('settle'),
  step('waive'),
  step('accept', 'Accept opens once D-2 is settled.'),
  step('decline'),
];

describe('the steps in the head of a case', () => {
  it('begin with what comes next, and keep a closed one with what opens it', () => {
    const { buttons, menu } = headSteps({ state: 'in-review', steps: IN_REVIEW }, 1);
    expect(buttons).toEqual([
      { step: 'return', label: 'Return with 1 discrepancy', next: true, open: true, reason: null },
      {
        step: 'accept',
        label: 'Accept',
        next: false,
        open: false,
        reason: 'Accept opens once D-2 is settled.',
      },
    ]);
    expect(menu.map((s) => s.step)).toEqual(['decline', 'hand-over', 'put-back']);
  });

  it('offer only to take a filed case, and say what it waits for', () => {
    const steps = [
      step('take', 'Take opens once the check is done.'),
      step('accept', 'x'),
      step('return', 'y'),
    ];
    const { buttons, menu } = headSteps({ state: 'filed', steps }, 0);
    expect(buttons.map((s) => [s.step, s.reason])).toEqual([['take', 'Take opens once the check is done.']]);
    expect(menu).toEqual([]);
  });

  it('make accepting the next step once nothing is left to return', () => {
    const steps = [step('return', 'Return opens once a discrepancy is open.'), step('accept')];
    const { buttons } = headSteps({ state: 'in-review', steps }, 0);
    expect(buttons.find((s) => s.next)?.step).toBe('accept');
  });

  it('have nothing for who may take none, nor for a case that is decided', () => {
    expect(headSteps({ state: 'in-review', steps: [] }, 2)).toEqual({ buttons: [], menu: [] });
    expect(headSteps({ state: 'accepted', steps: IN_REVIEW }, 0).buttons).toEqual([]);
  });

  it('count what a letter would take along', () => {
    expect(countOpen([{ state: 'open' }, { state: 'answered' }, { state: 'settled' }])).toBe(1);
    expect([0, 1, 2].map(returnLabel)).toEqual([
      'Return',
      'Return with 1 discrepancy',
      'Return with 2 discrepancies',
    ]);
  });

  it('tell whether a step may be taken', () => {
    expect(isOpen({ steps: IN_REVIEW }, 'raise')).toBe(true);
    expect(isOpen({ steps: IN_REVIEW }, 'accept')).toBe(false);
    expect(isOpen({ steps: [] }, 'raise')).toBe(false);
  });
});
