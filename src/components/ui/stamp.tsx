export const STATE_WORDS = {
  draft: 'Draft',
  filed: 'Filed',
  'in-review': 'In review',
  returned: 'Returned',
  accepted: 'Accepted',
  declined: 'Declined',
  withdrawn: 'Withdrawn',
} as const;

export type StampState = keyof typeof STATE_WORDS;

/** A state, stamped: dashed while a draft, a double frame once accepted, struck through when withdrawn. */
export function Stamp({ state }: { state: StampState }) {
  return <span className={`stamp stamp-${state}`}>{STATE_WORDS[state]}</span>;
}
