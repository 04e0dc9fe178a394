import { render, screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { Finding, RevisionLine } from '#shared/contracts/api.generated';
import { BalanceSection } from '../../../../src/features/line-sheet/components/balance-section';

const value = (parameter: string, over: object = {}) => ({
  circuit: 1,
  parameter,
  declared: 0.381,
  asDeclared: null,
  recomputed: 0.381,
  low: null,
  high: null,
  deviation: 0,
  tolerance: 0.015,
  typical: [0.3, 0.53],
  outer: [0.23, 0.62],
  source: null,
  grade: null,
  follows: null,
  ...over,
});

const finding = (over: Partial<Finding>) =>
  ({
    fingerprint: over.code,
    family: 'geometry',
    grade: 'must-answer',
    lineKey: 'L1',
    circuit: 1,
    section: null,
    position: null,
    parameter: 'x1',
    group: 1,
    causes: [],
    first: true,
    follows: null,
    stands: true,
    disposition: null,
    discrepancy: null,
    ...over,
  }) as Finding;

const X1 = finding({
  code: 'geometry.x1',
  message: 'X1 is 61 % above what the geometry gives: 0.613 Ω/km declared.',
  causes: [
    {
      code: 'per-mile',
      in: 'declared',
      explains: ['x1'],
      corrected: { x1: 0.381 },
      residual: 0.001,
      sentence: 'Fits within 0.1 % if the value is per mile.',
    },
  ],
});
const ALSO = finding({
  code: 'typical.x1',
  family: 'typical',
  message: 'X1 lies above its band.',
  first: false,
});
const SLOW = finding({
  code: 'physics.wave-speed',
  family: 'physics',
  parameter: 'waveSpeed',
  message: 'Wave speed is low.',
  follows: 'x1',
});

const line = (findings: Finding[]) =>
  ({
    name: 'Fellgate – Sarn',
    bandClassKv: 345,
    findings,
    values: [
      value('r1'),
      value('x1', { declared: 0.613, deviation: 0.609, grade: 'must-answer' }),
      value('waveSpeed', { follows: 'x1' }),
    ],
  }) as unknown as RevisionLine;

const group = (name: RegExp) =>
  screen.getByRole('rowheader', { name }).closest('tbody') as HTMLTableSectionElement;

describe('the balance of a line', () => {
  it('keeps findings inside the group of their row, the cause once', () => {
    render(<BalanceSection line={line([ALSO, SLOW, X1])} circuit={1} />);
    const x1 = within(group(/^X1/));
    expect(x1.getByText('X1 is 61 % above what the geometry gives.')).toBeInTheDocument();
    expect(x1.getByText('Fits within 0.1 % if the value is per mile.')).toBeInTheDocument();
    expect(x1.getByText('Same cause.')).toBeInTheDocument();
    expect(within(group(/^Wave speed/)).getByText('Follows X1.')).toBeInTheDocument();
    expect(group(/^R1/).rows).toHaveLength(1);
  });

  it('counts a matter once, and what follows not at all', () => {
    render(<BalanceSection line={line([SLOW, X1])} circuit={1} />);
    expect(screen.getByText('1 must answer')).toBeInTheDocument();
    expect(screen.getByText('1 follows from X1')).toBeInTheDocument();
  });

  it('says how a settled value was settled, and no longer asks', () => {
    const disposition = {
      kind: 'settled' as const,
      inForce: true,
      revision: 'B',
      reason: 'The maker confirms it.',
      by: { id: 'u', name: 'M. Thornholt' },
      at: '2027-03-04T12:00:00Z',
      countersignedBy: null,
      carriedOver: false,
    };
    render(<BalanceSection line={line([{ ...X1, stands: false, disposition }])} circuit={1} />);
    expect(within(group(/^X1/)).getByText('X1 settled')).toBeInTheDocument();
    expect(within(group(/^X1/)).getByText(/Settled by M. Thornholt on revision B/)).toBeInTheDocument();
    expect(group(/^X1/)).not.toHaveClass('wash-must-answer');
  });

  it('shows what a page lets one do, finding by finding', () => {
    render(
      <BalanceSection
        line={line([X1])}
        circuit={1}
        findingActions={(f) => <button type="button">{`Raise ${f.code}`}</button>}
      />,
    );
    expect(within(group(/^X1/)).getByRole('button', { name: 'Raise geometry.x1' })).toBeInTheDocument();
  });

  it('shows the other circuit’s findings with the other circuit only', () => {
    render(<BalanceSection line={line([{ ...X1, circuit: 2 }])} circuit={1} />);
    expect(screen.queryByText(/above what the geometry gives/)).not.toBeInTheDocument();
  });
});
